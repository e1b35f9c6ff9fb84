import { spawn } from 'node:child_process';
import { mkdirSync, readFileSync, rmSync } from 'node:fs';

/**
 * Runs one project, or those of its files that `args` choose, and gives how many tests passed and failed; a run
 * that counted nothing has failed. `name` is its report's, where several run side by side.
 */
export async function runVitest(project, { env = {}, args = [], name = project } = {}) {
  mkdirSync('tests/.out', { recursive: true });
  const report = `tests/.out/${name}.json`;
  rmSync(report, { force: true });
  const run = spawn(
    process.execPath,
    [
      'node_modules/vitest/vitest.mjs',
      'run',
      '--project',
      project,
      '--reporter=default',
      '--reporter=json',
      `--outputFile.json=${report}`,
      ...args,
    ],
    { stdio: 'inherit', env: { ...process.env, ...env } },
  );
  const status = await new Promise((resolve) => run.once('exit', resolve));
  try {
    const { numPassedTests, numFailedTests } = JSON.parse(readFileSync(report, 'utf8'));
    const brokeOutsideTests = status !== 0 && numFailedTests === 0 ? 1 : 0;
    const ranNone = numPassedTests + numFailedTests === 0 ? 1 : 0;
    return {
      passed: numPassedTests,
      failed: numFailedTests + Math.max(brokeOutsideTests, ranNone),
    };
  } catch {
    return { passed: 0, failed: 1 };
  }
}
