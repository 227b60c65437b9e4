import { defineConfig } from 'vite'
import { aliases } from './aliases.ts'

/** Parts of the project that its commands run in Node, which cannot run TypeScript itself. */
export default defineConfig({
  resolve: { alias: aliases },
  build: {
    ssr: true,
    outDir: process.env.BUILD_FOLDER ?? 'build/programs',
    target: 'node20',
    rolldownOptions: { input: { 'prepare-database': 'drizzle/prepare.ts' } },
  },
})
