import { spawnSync } from 'node:child_process';
import { mkdirSync, readFileSync, rmSync } from 'node:fs';

/** Runs one project and gives how many tests passed and failed; a run that counted nothing has failed. */
export function runVitest(project, env = {}) {
  mkdirSync('tests/.out', { recursive: true });
  const report = `tests/.out/${project}.json`;
  rmSync(report, { force: true });
  const run = spawnSync(
    process.execPath,
    [
      'node_modules/vitest/vitest.mjs',
      'run',
      '--project',
      project,
      '--reporter=default',
      '--reporter=json',
      `--outputFile.json=${report}`,
    ],
    { stdio: 'inherit', env: { ...process.env, ...env } },
  );
  try {
    const { numPassedTests, numFailedTests } = JSON.parse(readFileSync(report, 'utf8'));
    const brokeOutsideTests = run.status !== 0 && numFailedTests === 0 ? 1 : 0;
    const ranNone = numPassedTests + numFailedTests === 0 ? 1 : 0;
    return {
      passed: numPassedTests,
      failed: numFailedTests + Math.max(brokeOutsideTests, ranNone),
    };
  } catch {
    return { passed: 0, failed: 1 };
  }
}
