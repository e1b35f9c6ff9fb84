/** `npm run bench`: what a browser must load, and how long the engine and the diary take. A table, never a verdict. */
import { spawnSync } from 'node:child_process';
import { ensureInstalled } from '../../server/start/ensure-installed.mjs';

const say = (words) => console.log(`\n· ${words}`);
ensureInstalled(say);
const { ensureBuilt } = await import('../../server/start/ensure-built.mjs');
const { measureFirstLoad } = await import('./first-load.mjs');

ensureBuilt(say);
say('first-load JavaScript of each route, gzipped, beside an empty page of the framework');
await measureFirstLoad();
for (const script of [
  'fit-room.ts',
  'diary-week.ts',
  'openings.ts',
  'solomon.ts',
  'fuzz.ts',
  'blunder-study.ts',
]) {
  say(script);
  spawnSync(process.execPath, ['node_modules/tsx/dist/cli.mjs', `tests/bench/${script}`], {
    stdio: 'inherit',
  });
}
for (const script of ['thousand-messages.mjs', 'diary-model.mjs']) {
  say(script);
  spawnSync(process.execPath, [`tests/bench/${script}`], { stdio: 'inherit' });
}
