import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import os from 'node:os';
import path from 'node:path';
import { Client } from 'pg';
import type { TestProject } from 'vitest/node';
import { openInMemory } from '@/db/open-embedded';
import { openServer } from '@/db/open-server';

declare module 'vitest' {
  export interface ProvidedContext {
    /** A dump of a migrated embedded database, or null on a server. */
    templateDump: string | null;
    /** The server's address, with a migrated database named `setwell_template`, or null. */
    serverUrl: string | null;
  }
}

/** Migrates once; each test file then starts from a copy. `TEST_DATABASE_URL` runs the same tests on a server. */
export default async function setup(project: TestProject) {
  const serverUrl = process.env.TEST_DATABASE_URL ?? null;
  project.provide('serverUrl', serverUrl);
  if (serverUrl) {
    await makeServerTemplate(serverUrl);
    project.provide('templateDump', null);
    return;
  }
  const folder = mkdtempSync(path.join(os.tmpdir(), 'setwell-template-'));
  const file = path.join(folder, 'template.tar');
  const template = await openInMemory();
  writeFileSync(file, Buffer.from(await (await template.dump()).arrayBuffer()));
  await template.close();
  project.provide('templateDump', file);
  return () => rmSync(folder, { recursive: true, force: true });
}

async function makeServerTemplate(serverUrl: string) {
  const client = new Client({ connectionString: serverUrl });
  await client.connect();
  await client.query('DROP DATABASE IF EXISTS setwell_template');
  await client.query('CREATE DATABASE setwell_template');
  await client.end();
  const url = new URL(serverUrl);
  url.pathname = '/setwell_template';
  await (await openServer(url.href)).close();
}
