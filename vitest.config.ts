import { defineConfig } from 'vitest/config'
import { aliases } from './aliases.ts'
import { nodeThreads } from './node-threads.ts'

const plugins = [nodeThreads()]
const resolve = { alias: aliases }

export default defineConfig({
  test: {
    projects: [
      {
        plugins,
        resolve,
        test: {
          name: 'node',
          sequence: { groupOrder: 0 },
          include: ['tests/{laws,outside,unit}/**/*.test.{ts,tsx}'],
          benchmark: { include: ['tests/bench/**/*.bench.ts'] },
          environment: 'node',
          testTimeout: 60_000,
        },
      },
      {
        plugins,
        resolve,
        test: {
          name: 'database',
          sequence: { groupOrder: 1 },
          include: ['tests/database/**/*.test.ts'],
          environment: 'node',
          testTimeout: 60_000,
          fileParallelism: false,
        },
      },
      {
        plugins,
        resolve,
        test: {
          name: 'commands',
          sequence: { groupOrder: 2 },
          include: ['tests/commands/**/*.test.ts'],
          environment: 'node',
          testTimeout: 60_000,
          hookTimeout: 60_000,
          fileParallelism: false,
        },
      },
      {
        plugins,
        resolve,
        test: {
          name: 'browser',
          sequence: { groupOrder: 3 },
          include: ['tests/browser/**/*.test.ts'],
          globalSetup: ['tests/browser/server.setup.ts'],
          environment: 'node',
          testTimeout: 90_000,
          hookTimeout: 60_000,
          fileParallelism: false,
        },
      },
    ],
  },
})
