import path from 'node:path';
import { defineConfig } from 'vitest/config';

const resolve = {
  alias: {
    '@': path.resolve(import.meta.dirname),
    'server-only': path.resolve(import.meta.dirname, 'tests/setup/server-only.ts'),
  },
};

export default defineConfig({
  resolve,
  test: {
    projects: [
      {
        resolve,
        test: {
          name: 'unit',
          include: ['lib', 'reference', 'rules', 'components'].map(
            (part) => `tests/${part}/**/*.test.ts`,
          ),
          setupFiles: ['tests/setup/one-seed.ts'],
          // Nothing that these look at keeps anything: to load it anew for each file is half their time.
          isolate: false,
        },
      },
      {
        resolve,
        test: {
          name: 'database',
          include: ['tests/server/**/*.test.ts', 'tests/api/**/*.test.ts'],
          globalSetup: 'tests/setup/template-database.ts',
          setupFiles: ['tests/setup/one-seed.ts', 'tests/setup/own-database.ts'],
          maxWorkers: 2,
          // Modules are loaded once a worker; own-database.ts lets go of what an earlier file held.
          isolate: false,
          testTimeout: 30_000,
          hookTimeout: 60_000,
        },
      },
      {
        resolve,
        test: {
          name: 'browser',
          include: ['tests/browser/**/*.test.ts'],
          globalSetup: 'tests/setup/running-server.ts',
          fileParallelism: false,
          expect: { poll: { timeout: 10_000 } },
          testTimeout: 180_000,
          hookTimeout: 180_000,
        },
      },
    ],
  },
});
