import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { sql } from 'drizzle-orm';
import { Client } from 'pg';
import { afterAll, inject } from 'vitest';
import type { OpenDatabase } from '@/db/database';
import { openInMemory } from '@/db/open-embedded';
import { openServer } from '@/db/open-server';
import { setDatabase } from '@/server/base/database';

// What the program holds for its process: each file begins as a program that has just started.
for (const name of Object.keys(globalThis)) {
  if (/^(__)?setwell/.test(name)) Reflect.deleteProperty(globalThis, name);
}

const dataFolder = mkdtempSync(path.join(os.tmpdir(), 'setwell-test-'));
process.env.SETWELL_DATA = dataFolder;
process.env.PUBLIC_URL = 'http://localhost:3000';
process.env.BETTER_AUTH_SECRET = 'only-for-tests-only-for-tests';

const emptyAllTables = sql`DO $$ BEGIN EXECUTE (
  SELECT 'TRUNCATE ' || string_agg(format('%I', tablename), ', ') || ' CASCADE'
  FROM pg_tables WHERE schemaname = 'public'
); END $$`;

const serverUrl = inject('serverUrl');
const name = `setwell_test_${process.pid}_${Math.floor(performance.now() * 1000)}`;
const open = serverUrl ? await openOwnOnServer(serverUrl) : await openOwnEmbedded();
setDatabase(open);

afterAll(async () => {
  await open.close();
  if (serverUrl) await onServer(serverUrl, `DROP DATABASE ${name} WITH (FORCE)`);
  rmSync(dataFolder, { recursive: true, force: true });
});

/** One a worker, emptied for each file: to start one takes longer than most files. */
async function openOwnEmbedded(): Promise<OpenDatabase> {
  const worker = globalThis as typeof globalThis & { ownEmbedded?: OpenDatabase };
  if (worker.ownEmbedded) {
    await worker.ownEmbedded.db.execute(emptyAllTables);
  } else {
    const dump = inject('templateDump');
    if (!dump) throw new Error('the template was not made');
    worker.ownEmbedded = await openInMemory(new Blob([readFileSync(dump)]));
  }
  return { ...worker.ownEmbedded, close: async () => {} };
}

async function openOwnOnServer(url: string): Promise<OpenDatabase> {
  await onServer(url, `CREATE DATABASE ${name} TEMPLATE setwell_template`);
  const own = new URL(url);
  own.pathname = `/${name}`;
  return openServer(own.href);
}

async function onServer(url: string, sql: string) {
  const client = new Client({ connectionString: url });
  await client.connect();
  await client.query(sql);
  await client.end();
}
