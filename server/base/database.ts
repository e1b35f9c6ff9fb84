import type { OpenDatabase } from '@/db/database';
import { openDatabase } from '@/db/open';
import { env } from './env';
import { logBug } from './log';

type Held = { __setwellDatabase?: Promise<OpenDatabase> };

/** One database a process, however many copies of this module the bundler makes. */
export function database(): Promise<OpenDatabase> {
  const held = globalThis as Held;
  held.__setwellDatabase ??= open();
  return held.__setwellDatabase;
}

/** Tests put their own in. */
export function setDatabase(open: OpenDatabase) {
  (globalThis as Held).__setwellDatabase = Promise.resolve(open);
}

async function open(): Promise<OpenDatabase> {
  const { building, databaseUrl, dataDirectory } = env();
  if (building) throw new Error('The build must not open the database.');
  return openDatabase({
    databaseUrl,
    dataDirectory,
    whenCut: (error) => logBug('a connection to the database was cut', error),
  });
}
