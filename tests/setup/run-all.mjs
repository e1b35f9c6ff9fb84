/** `npm test`: everything, in order of how soon it tells. */
import { spawnSync } from 'node:child_process';
import { ensureInstalled } from '../../server/start/ensure-installed.mjs';

const began = Date.now();
const say = (words) => console.log(`\n· ${words}`);
ensureInstalled(say);
const { ensureBuilt } = await import('../../server/start/ensure-built.mjs');
const { findChromium } = await import('./find-chromium.mjs');
const { runVitest } = await import('./run-vitest.mjs');

const total = { passed: 0, failed: 0 };
const count = ({ passed, failed }) => {
  total.passed += passed;
  total.failed += failed;
};
const step = (words, command, args) => {
  say(words);
  const failed = spawnSync(command, args, { stdio: 'inherit' }).status !== 0;
  count(failed ? { passed: 0, failed: 1 } : { passed: 1, failed: 0 });
};

step('format and lint', process.execPath, ['node_modules/@biomejs/biome/bin/biome', 'check', '.']);
step('types', process.execPath, ['node_modules/typescript/lib/tsc.js', '--noEmit']);
say('unit tests, published references, rules');
count(await runVitest('unit'));
say('database and API tests, on the embedded database');
count(await runVitest('database'));
say('browser tests');
const chromium = findChromium();
if (chromium) {
  ensureBuilt(say);
  for (const counts of await runBrowserTests({ CHROMIUM: chromium })) count(counts);
} else {
  count({ passed: 0, failed: 1 });
}
console.log(`\n${Math.round((Date.now() - began) / 1000)} s`);
console.log(`${total.passed} passed, ${total.failed} failed`);
process.exit(total.failed === 0 ? 0 : 1);

/** Two at a time, each with a program and a shop of its own: much of such a test is waiting. */
function runBrowserTests(env) {
  const first = ['main-path', 'booking', 'exchange', 'diary-hands', 'doors'].map(
    (file) => `tests/browser/${file}.test.ts`,
  );
  const others = first.map((file) => `--exclude=${file}`);
  return Promise.all([
    runVitest('browser', { env, args: first, name: 'browser-1' }),
    runVitest('browser', { env, args: others, name: 'browser-2' }),
  ]);
}
