/** `npm run restore -- <copy> [--to <data folder>]`: puts a copy of the database where there is none. */
import { cpSync, existsSync, mkdirSync, readFileSync, renameSync, rmSync } from 'node:fs';
import path from 'node:path';
import { parseArgs } from 'node:util';
import { gunzipSync } from 'node:zlib';
import { ensureInstalled } from './ensure-installed.mjs';
import { isOwned } from './is-owned.mjs';

ensureInstalled((words) => console.log(`· ${words}`));
const { PGlite } = await import('@electric-sql/pglite');
const { btree_gist } = await import('@electric-sql/pglite/contrib/btree_gist');
const { pg_trgm } = await import('@electric-sql/pglite/contrib/pg_trgm');

const { values, positionals } = parseArgs({
  allowPositionals: true,
  options: { to: { type: 'string' } },
});
const copy = positionals[0];
if (!copy || !existsSync(copy)) {
  stop(
    `Say which copy: npm run restore -- .data/back-ups/setwell-….tar.gz${copy ? ` (there is no ${copy})` : ''}`,
  );
}
const dataDirectory = path.resolve(values.to ?? process.env.SETWELL_DATA ?? '.data');
const database = path.join(dataDirectory, 'database');
if (await isOwned(database))
  stop(`Setwell is running on ${dataDirectory}. Stop it first; nothing was changed.`);
if (existsSync(database)) {
  stop(
    `There is a database in ${dataDirectory} already. Move ${database} away first, or name an empty folder by --to; nothing was changed.`,
  );
}

// Built aside and named last: a restore that is broken off leaves no half of a database.
const aside = `${database}.part`;
rmSync(aside, { recursive: true, force: true });
mkdirSync(dataDirectory, { recursive: true });
const opened = await PGlite.create({
  dataDir: aside,
  loadDataDir: new Blob([gunzipSync(readFileSync(copy))]),
  extensions: { btree_gist, pg_trgm },
});
const count = async (table) =>
  Number((await opened.query(`SELECT count(*) AS n FROM ${table}`)).rows[0].n);
const found = `${await count('jobs')} jobs, ${await count('visits')} visits, ${await count('readings')} readings`;
await opened.exec('CHECKPOINT');
await opened.close();
for (const name of ['files', 'secret']) {
  const kept = path.join(path.dirname(copy), name);
  if (existsSync(kept))
    cpSync(kept, path.join(dataDirectory, name), { recursive: true, force: false });
}
renameSync(aside, database);
console.log(`Restored into ${dataDirectory}: ${found}.`);

function stop(words) {
  console.error(words);
  process.exit(1);
}
