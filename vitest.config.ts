import { fileURLToPath } from 'node:url'
import vue from '@vitejs/plugin-vue'
import { defineConfig } from 'vitest/config'

const root = fileURLToPath(new URL('.', import.meta.url))
const alias = { '~': `${root}app`, '@': `${root}app` }

// Projects: pure and component tests, what must not compile, tests against the built server and PostgreSQL, the browser story.
export default defineConfig({
  test: {
    projects: [
      { plugins: [vue()], resolve: { alias }, test: { name: 'unit', include: ['tests/unit/**/*.test.ts'], setupFiles: ['tests/unit/seeds.ts'], testTimeout: 60_000 } },
      { test: { name: 'types', include: [], typecheck: { enabled: true, only: true, include: ['tests/types/**/*.test-d.ts'], tsconfig: 'tests/types/tsconfig.json' } } },
      {
        resolve: { alias },
        test: {
          name: 'api', include: ['tests/api/**/*.test.ts'], globalSetup: ['tests/api/global-setup.ts'],
          testTimeout: 60_000, hookTimeout: 120_000, fileParallelism: false,
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'browser', include: ['tests/browser/**/*.test.ts'], globalSetup: ['tests/api/global-setup.ts'], expect: { poll: { timeout: 20_000 } },
          testTimeout: 300_000, hookTimeout: 120_000, fileParallelism: false,
        },
      },
      { resolve: { alias }, test: { name: 'measure', include: ['tests/bench/**/*.measure.ts'], globalSetup: ['tests/api/global-setup.ts'], testTimeout: 600_000, hookTimeout: 120_000, fileParallelism: false } },
      { resolve: { alias }, test: { name: 'deep', include: ['tests/deep/**/*.test.ts'], testTimeout: 600_000, fileParallelism: false } },
    ],
  },
})
