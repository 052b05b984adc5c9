import react from '@vitejs/plugin-react'
import { defineConfig } from 'vitest/config'

export default defineConfig({
  test: {
    projects: [
      {
        test: {
          name: 'unit',
          environment: 'node',
          include: ['tests/**/*.test.ts'],
          exclude: ['tests/{api,client,e2e}/**'],
          setupFiles: 'tests/support/property-seed.ts',
          testTimeout: 60_000,
        },
      },
      {
        test: {
          name: 'api',
          environment: 'node',
          include: ['tests/api/**/*.test.ts'],
          globalSetup: 'tests/support/test-cluster-setup.ts',
          testTimeout: 60_000,
          hookTimeout: 180_000,
        },
      },
      {
        plugins: [react()],
        test: {
          name: 'client',
          environment: 'jsdom',
          include: ['tests/client/**/*.test.{ts,tsx}'],
          setupFiles: 'tests/support/client-setup.ts',
          testTimeout: 60_000,
          css: false,
        },
      },
    ],
  },
})
