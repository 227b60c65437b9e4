import { reactRouter } from '@react-router/dev/vite'
import tailwindcss from '@tailwindcss/vite'
import { defineConfig } from 'vite'
import { aliases } from './aliases.ts'
import { nodeThreads } from './node-threads.ts'

export default defineConfig({
  plugins: [tailwindcss(), reactRouter(), nodeThreads()],
  resolve: { alias: aliases },
  environments: {
    ssr: { build: { rollupOptions: { input: './app/server/app.ts' } } },
  },
  optimizeDeps: {
    // Named in route modules, yet only loaders use them, which do not reach the browser.
    exclude: ['drizzle-orm', 'pg', 'pino'],
    include: [
      '@tanstack/react-query',
      'comlink',
      'd3-scale',
      'd3-shape',
      'mathjs',
      'odex',
      'react',
      'react-dom',
      'react-dom/client',
      'react/jsx-dev-runtime',
      'react/jsx-runtime',
      'react-router',
      'react-router/dom',
      'zod',
    ],
  },
  worker: { format: 'es' },
})
