import type { PgDatabase, PgQueryResultHKT } from 'drizzle-orm/pg-core';
import type * as schema from './schema';

/** The same queries run on the embedded database and on a server. */
export type Database = PgDatabase<PgQueryResultHKT, typeof schema>;
/** Inside `db.transaction(async (tx) => …)`: the outer `db` must not be used there. */
export type Transaction = Parameters<Parameters<Database['transaction']>[0]>[0];

export type OpenDatabase = {
  db: Database;
  kind: 'embedded' | 'server';
  /** Hears `NOTIFY channel`, and an empty payload when something may have been missed; gives what stops it. */
  listen(channel: string, hear: (payload: string) => void): Promise<() => Promise<void>>;
  /** A copy of everything, for the embedded database; a server has its own ways. */
  dump(): Promise<Blob>;
  close(): Promise<void>;
};
