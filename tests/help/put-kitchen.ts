import { randomUUID } from 'node:crypto';
import { tools } from '@/db/schema';
import type { Reading } from '@/lib/contracts/readings';
import { database } from '@/server/base/database';
import { recordReadings } from '@/server/walls/record-readings';
import { saveRoom } from '@/server/walls/save-room';
import { saveRuns } from '@/server/walls/save-runs';
import { type CrookedKitchen, crookedKitchen } from './crooked-kitchen';
import { contextOf, type TestShop } from './make-shop';
import { startTestJob } from './start-test-job';

export type PutKitchen = CrookedKitchen & { jobId: string; roomId: string };

/** A job with a drawn kitchen and its tools, nothing read yet. */
export async function putDrawnKitchen(
  shop: TestShop,
  options: { crookedness?: number } = {},
): Promise<PutKitchen> {
  const { jobId } = await startTestJob(shop);
  const kitchen = crookedKitchen({ ...options, newId: randomUUID });
  const { room, tools: ofBook } = kitchen.wallBook;
  const { db } = await database();
  await db.insert(tools).values(ofBook.map((tool) => ({ ...tool, shopId: shop.shop.id })));
  await saveRoom(await contextOf(shop, 'measurer', new Date()), { jobId, room });
  return { ...kitchen, jobId, roomId: room.id };
}

/** The same, read and laid out. */
export async function putKitchen(
  shop: TestShop,
  options: { crookedness?: number } = {},
): Promise<PutKitchen> {
  const kitchen = await putDrawnKitchen(shop, options);
  const { roomId, runs, wallBook } = kitchen;
  const ctx = await contextOf(shop, 'measurer', new Date());
  await recordReadings(ctx, { roomId, readings: wallBook.readings });
  await saveRuns(ctx, { roomId, runs });
  return kitchen;
}

/** A new length reading on a wall of the kitchen, as a phone sends it. */
export function lengthOn(
  { wallBook }: CrookedKitchen,
  place: number,
  change: Partial<Extract<Reading, { kind: 'length' }>> = {},
): Extract<Reading, { kind: 'length' }> {
  const wall = wallBook.room.chains[0]?.walls[place];
  const tool = wallBook.tools[0];
  if (!wall || !tool) throw new Error('the kitchen has no such wall');
  return {
    id: randomUUID(),
    roomId: wallBook.room.id,
    toolId: tool.id,
    takenAt: '2026-12-01T15:10:00.000Z',
    typed: '141 3/4',
    unit: 'in',
    touches: 'board',
    kind: 'length',
    wallId: wall.id,
    zMm: 914.4,
    yMm: 0,
    valueMm: 3600.45,
    ...change,
  };
}
