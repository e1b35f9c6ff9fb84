import Dexie, { type EntityTable, type Table } from 'dexie';
import type { WallBookView } from '@/lib/contracts/rooms';
import type { KeptPhoto } from '@/lib/photos/kept-photo';
import type { Queued } from '@/lib/sync/queued';

type PhoneTables = {
  /** What the office has not yet said that it has. */
  queue: Table<Queued, number, Omit<Queued, 'order'>>;
  /** The office's last word to a person on each room opened here, with what it has taken since. */
  rooms: EntityTable<{ roomId: string; personId: string; view: WallBookView }, 'roomId'>;
  /** Half-typed values, choices and sketches, by a name of their own. */
  drafts: EntityTable<{ key: string; value: unknown }, 'key'>;
  /** What the office last showed of the day, and whom; gone with a sign-out. */
  kept: EntityTable<{ key: string; value: unknown }, 'key'>;
  /** Photos, until the office has had them for a while. */
  photos: EntityTable<KeptPhoto, 'id'>;
};
export type PhoneDatabase = Dexie & PhoneTables;

export { liveQuery } from 'dexie';

/**
 * The phone's own store. It is migrated by adding a version below, never deleted. Strict durability: the
 * promise of a write holds only when it is on the disk, not when it is on its way.
 */
export function phoneTables(): PhoneDatabase {
  const database = new Dexie('setwell', {
    chromeTransactionDurability: 'strict',
  }) as PhoneDatabase;
  database.version(1).stores({
    queue: '++order, &id, roomId',
    rooms: 'roomId',
    drafts: 'key',
  });
  database.version(2).stores({ kept: 'key', photos: 'id, roomId' });
  return database;
}
