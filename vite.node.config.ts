import { defineConfig } from 'vite'
import { aliases } from './aliases.ts'

/** Programs that Node runs beside the web server, which it cannot run as TypeScript. */
export default defineConfig({
  resolve: { alias: aliases },
  build: {
    ssr: true,
    outDir: 'build/node',
    target: 'node20',
    rollupOptions: { input: { 'prepare-database': 'drizzle/prepare.ts' } },
  },
})
