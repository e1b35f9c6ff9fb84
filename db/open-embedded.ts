import path from 'node:path';
import { PGlite } from '@electric-sql/pglite';
import { btree_gist } from '@electric-sql/pglite/contrib/btree_gist';
import { pg_trgm } from '@electric-sql/pglite/contrib/pg_trgm';
import { drizzle } from 'drizzle-orm/pglite';
import { migrate } from 'drizzle-orm/pglite/migrator';
import type { OpenDatabase } from './database';
import { migrationsFolder } from './migrations-folder';
import { takeOwnerLock } from './owner-lock';
import * as schema from './schema';

const extensions = { btree_gist, pg_trgm };

/** Opens the one embedded database of this directory, and brings it up to date. */
export async function openEmbedded(dataDirectory: string): Promise<OpenDatabase> {
  const directory = path.join(dataDirectory, 'database');
  const lock = await takeOwnerLock(directory);
  const client = await PGlite.create({ dataDir: directory, extensions });
  const open = await wrap(client);
  return {
    ...open,
    close: async () => {
      await open.close();
      lock.close();
    },
  };
}

/** In memory, for tests; from a dump where one is given. */
export async function openInMemory(dump?: Blob): Promise<OpenDatabase> {
  return wrap(await PGlite.create({ extensions, loadDataDir: dump }));
}

async function wrap(client: PGlite): Promise<OpenDatabase> {
  const db = drizzle(client, { schema });
  await migrate(db, { migrationsFolder: migrationsFolder() });
  return {
    db,
    kind: 'embedded',
    listen: async (channel, hear) => client.listen(channel, hear),
    dump: () => client.dumpDataDir('none'),
    close: async () => {
      await client.exec('CHECKPOINT');
      await client.close();
    },
  };
}
