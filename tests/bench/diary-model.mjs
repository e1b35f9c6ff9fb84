/** Some thousands of random bookings, moves, holds, lapses and callings off by several people: nobody in two places. */
import { spawnSync } from 'node:child_process';

const test = 'tests/server/diary-model.test.ts';
const { status } = spawnSync(
  process.execPath,
  ['node_modules/vitest/vitest.mjs', 'run', '--project', 'database', test],
  { stdio: 'inherit', env: { ...process.env, SETWELL_DIARY_RUNS: '150' } },
);
process.exitCode = status ?? 1;
