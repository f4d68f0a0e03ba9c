import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const root = fileURLToPath(new URL('.', import.meta.url));
const shared = { resolve: { alias: { '@': root.replace(/\/$/, '') } } };

export default defineConfig({
  ...shared,
  test: {
    projects: [
      {
        ...shared,
        test: {
          name: 'unit',
          include: ['test/**/*.test.ts'],
          exclude: ['test/api/**', 'test/e2e/**'],
          testTimeout: 60_000,
        },
      },
      {
        ...shared,
        test: {
          name: 'api',
          include: ['test/api/**/*.test.ts'],
          globalSetup: ['test/api/template-database.ts'],
          testTimeout: 60_000,
          hookTimeout: 60_000,
        },
      },
      {
        ...shared,
        test: {
          name: 'e2e',
          include: ['test/e2e/**/*.test.ts'],
          globalSetup: ['test/e2e/product.ts'],
          fileParallelism: false,
          testTimeout: 120_000,
          hookTimeout: 120_000,
        },
      },
    ],
  },
});
