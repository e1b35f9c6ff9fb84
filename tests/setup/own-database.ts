import { mkdtempSync, readFileSync, rmSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { Client } from 'pg';
import { afterAll, inject } from 'vitest';
import type { OpenDatabase } from '@/db/database';
import { openInMemory } from '@/db/open-embedded';
import { openServer } from '@/db/open-server';
import { setDatabase } from '@/server/base/database';

const dataFolder = mkdtempSync(path.join(os.tmpdir(), 'setwell-test-'));
process.env.SETWELL_DATA = dataFolder;
process.env.PUBLIC_URL = 'http://localhost:3000';
process.env.BETTER_AUTH_SECRET = 'only-for-tests-only-for-tests';

const serverUrl = inject('serverUrl');
const name = `setwell_test_${process.pid}_${Math.floor(performance.now() * 1000)}`;
const open = serverUrl ? await openOwnOnServer(serverUrl) : await openOwnEmbedded();
setDatabase(open);

afterAll(async () => {
  await open.close();
  if (serverUrl) await onServer(serverUrl, `DROP DATABASE ${name} WITH (FORCE)`);
  rmSync(dataFolder, { recursive: true, force: true });
});

async function openOwnEmbedded(): Promise<OpenDatabase> {
  const dump = inject('templateDump');
  if (!dump) throw new Error('the template was not made');
  return openInMemory(new Blob([readFileSync(dump)]));
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
