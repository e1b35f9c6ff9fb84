import { setTimeout as wait } from 'node:timers/promises';
import { drizzle } from 'drizzle-orm/node-postgres';
import { migrate } from 'drizzle-orm/node-postgres/migrator';
import { Client, Pool } from 'pg';
import type { OpenDatabase } from './database';
import { migrationsFolder } from './migrations-folder';
import * as schema from './schema';

/** Two starters migrate one after the other: the second finds nothing to do. */
const migrationLock = 7_305_551;
const listenAgainMs = 1_000;

/**
 * A connection that waits in the pool may be cut by the server at any time (a restart, a fail-over): the
 * pool opens another for the next query, so it is `whenCut` that is told, and nothing stops.
 */
export async function openServer(
  databaseUrl: string,
  whenCut: (error: Error) => void = () => {},
): Promise<OpenDatabase> {
  await migrateOnce(databaseUrl);
  const pool = new Pool({ connectionString: databaseUrl, max: 10 });
  pool.on('error', whenCut);
  return {
    db: drizzle(pool, { schema }),
    kind: 'server',
    listen: (channel, hear) => listen(databaseUrl, channel, hear, whenCut),
    dump: () => {
      throw new Error('A PostgreSQL server is backed up with its own tools (pg_dump).');
    },
    close: () => pool.end(),
  };
}

async function migrateOnce(databaseUrl: string) {
  const client = new Client({ connectionString: databaseUrl });
  await client.connect();
  try {
    await client.query('SELECT pg_advisory_lock($1)', [migrationLock]);
    await migrate(drizzle(client, { schema }), { migrationsFolder: migrationsFolder() });
  } finally {
    await client.end();
  }
}

/**
 * Listens on a connection of its own. When that is cut it is opened again, and an empty payload says that
 * something may have been missed meanwhile.
 */
async function listen(
  databaseUrl: string,
  channel: string,
  hear: (payload: string) => void,
  whenCut: (error: Error) => void,
) {
  let isOver = false;
  let client = await openListener();

  async function openListener(): Promise<Client> {
    const opened = new Client({ connectionString: databaseUrl });
    opened.on('error', whenCut);
    opened.on('notification', (message) => hear(message.payload ?? ''));
    await opened.connect();
    await opened.query(`LISTEN "${channel.replaceAll('"', '')}"`);
    opened.on('end', () => void openAgain());
    return opened;
  }

  async function openAgain(): Promise<void> {
    while (!isOver) {
      await wait(listenAgainMs);
      try {
        client = await openListener();
        hear('');
        return;
      } catch (error) {
        whenCut(error as Error);
      }
    }
  }

  return async () => {
    isOver = true;
    await client.end();
  };
}
