import path from 'node:path';
import { defineConfig } from 'vitest/config';

const resolve = {
  alias: {
    '@': path.resolve(__dirname),
    'server-only': path.resolve(__dirname, 'tests/setup/server-only.ts'),
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
          include: [
            'tests/lib/**/*.test.ts',
            'tests/reference/**/*.test.ts',
            'tests/rules/**/*.test.ts',
          ],
        },
      },
    ],
  },
});
