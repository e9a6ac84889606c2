import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { defineConfig } from 'vitest/config';

const root = path.dirname(fileURLToPath(import.meta.url));
const alias = {
  '@': root,
  // Next's own empty module: these files run on the server, and so do the tests.
  'server-only': path.join(root, 'node_modules/next/dist/compiled/server-only/empty.js'),
};

export default defineConfig({
  resolve: { alias },
  test: {
    projects: [
      {
        resolve: { alias },
        test: {
          name: 'unit',
          environment: 'node',
          // Two busy cores stretch a second of arithmetic to many; a hang still ends.
          testTimeout: 20_000,
          include: ['lib/**/*.test.ts', 'db/**/*.test.ts', 'tests/truth/**/*.test.ts', 'tests/house/**/*.test.ts'],
          setupFiles: ['tests/setup/no-console-error.ts'],
        },
      },
      {
        resolve: { alias },
        oxc: { jsx: { runtime: 'automatic' } },
        test: {
          name: 'dom',
          environment: 'happy-dom',
          testTimeout: 20_000,
          include: ['components/**/*.test.tsx', 'lib/client/**/*.test.tsx'],
          setupFiles: ['tests/setup/no-console-error.ts', 'tests/setup/msw.ts'],
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'db',
          environment: 'node',
          include: ['tests/db/**/*.test.ts'],
          globalSetup: ['tests/setup/template-database.ts'],
          setupFiles: ['tests/setup/no-console-error.ts'],
          testTimeout: 30_000,
          hookTimeout: 60_000,
          maxWorkers: 2,
          // Tiers with their own number of workers run one after another.
          sequence: { groupOrder: 1 },
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'api',
          environment: 'node',
          include: ['tests/api/**/*.test.ts'],
          globalSetup: ['tests/setup/server.ts'],
          setupFiles: ['tests/setup/no-console-error.ts'],
          testTimeout: 60_000,
          hookTimeout: 120_000,
          fileParallelism: false,
          sequence: { groupOrder: 2 },
        },
      },
      {
        resolve: { alias },
        test: {
          name: 'browser',
          environment: 'node',
          include: ['tests/browser/**/*.test.ts'],
          globalSetup: ['tests/setup/server.ts'],
          testTimeout: 120_000,
          hookTimeout: 120_000,
          fileParallelism: false,
          sequence: { groupOrder: 3 },
        },
      },
    ],
  },
});
