import type { OpenDatabase } from './database';

/** A PostgreSQL server by its address, else the embedded database in the data directory. */
export async function openDatabase(where: {
  databaseUrl: string | null;
  dataDirectory: string;
  whenCut: (error: Error) => void;
}): Promise<OpenDatabase> {
  if (where.databaseUrl) {
    return (await import('./open-server')).openServer(where.databaseUrl, where.whenCut);
  }
  return (await import('./open-embedded')).openEmbedded(where.dataDirectory);
}
