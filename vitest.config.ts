import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const root = fileURLToPath(new URL('.', import.meta.url));
const alias = {
  '@/': root,
  // The marker that keeps server files out of the browser's bundle has nothing to guard here.
  'server-only': fileURLToPath(new URL('./tests/support/server-only.ts', import.meta.url)),
};

export default defineConfig({
  resolve: { alias },
  test: {
    maxWorkers: 2,
    projects: [
      {
        extends: true,
        test: {
          name: 'unit',
          // Thousands of random cases take their time on a busy machine.
          testTimeout: 30_000,
          include: ['tests/**/*.test.{ts,tsx,mjs}'],
          exclude: ['tests/**/*.db.test.{ts,mjs}', 'tests/e2e/**'],
        },
      },
      {
        extends: true,
        test: {
          name: 'database',
          include: ['tests/**/*.db.test.{ts,mjs}'],
          globalSetup: ['tests/support/database.ts'],
          fileParallelism: false,
          testTimeout: 30_000,
        },
      },
    ],
  },
});
