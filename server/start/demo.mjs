/** `npm run demo`: from a bare clone to a shop at work in a browser. `-- --fresh` starts over. */
import { existsSync, rmSync } from 'node:fs';
import path from 'node:path';
import { ensureBuilt } from './ensure-built.mjs';
import { ensureInstalled } from './ensure-installed.mjs';
import { isOwned } from './is-owned.mjs';
import { serve } from './serve.mjs';

const began = Date.now();
const say = (words) => console.log(`· ${words}`);
const port = Number(process.env.PORT ?? 3000);
const dataDirectory = path.resolve(process.env.SETWELL_DATA ?? '.data');

ensureInstalled(say);
ensureBuilt(say);
if (await isOwned(path.join(dataDirectory, 'database'))) {
  console.error(`Setwell is running on ${dataDirectory} already. Stop that one first.`);
  process.exit(1);
}
if (process.argv.includes('--fresh') && existsSync(dataDirectory)) {
  say(`removing ${dataDirectory} to start over`);
  rmSync(dataDirectory, { recursive: true });
}
say(
  existsSync(dataDirectory)
    ? 'opening the shop as it was left'
    : 'making the database and an invented shop (about 15 seconds, once)',
);

const child = await serve({ port, dataDirectory, demo: true, quiet: true }).catch((error) => {
  console.error(error.message);
  process.exit(1);
});
child.stdout.on('data', () => {});
for (const signal of ['SIGINT', 'SIGTERM']) process.on(signal, () => child.kill(signal));
child.once('exit', (code) => process.exit(code ?? 0));

const address = `http://localhost:${port}`;
console.log(`
Setwell is up after ${Math.round((Date.now() - began) / 1000)} s.

  ${address}/demo          the whole chain in three minutes
  ${address}/sign-in       one tap for each person of the shop
  ${address}/demo/phone    the customer's phone and inbox (a fake: nothing leaves this machine)

  Sign-ins, password setwell-demo:
    owner@juniperbend.example      scheduler@juniperbend.example   measurer@juniperbend.example
    bench@juniperbend.example      crew@juniperbend.example

  Data is kept in ${dataDirectory}. Ctrl-C stops; "npm run demo -- --fresh" starts over.
`);
