/** A thousand messages by two workers while the services fail in every way: each once, each in a stated state. */
import { spawnSync } from 'node:child_process';

const test = 'tests/server/outbox-faults.test.ts';
const { status } = spawnSync(
  process.execPath,
  ['node_modules/vitest/vitest.mjs', 'run', '--project', 'database', test, '-t', 'by two workers'],
  { stdio: 'inherit', env: { ...process.env, SETWELL_MESSAGES: '1000' } },
);
process.exitCode = status ?? 1;
