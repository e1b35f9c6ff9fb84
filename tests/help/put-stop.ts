import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { jobs } from '@/db/schema';
import type { BookedVisit } from '@/lib/contracts/visits';
import { fromLocal, localDate } from '@/lib/time/local-moment';
import { database } from '@/server/base/database';
import { getFit } from '@/server/sheets/get-fit';
import { releaseSheet } from '@/server/sheets/release-sheet';
import { bookTestVisit } from './book-test-visit';
import { makeCrew } from './make-crew';
import { contextOf, type TestShop } from './make-shop';
import { type PutKitchen, putKitchen } from './put-kitchen';
import { startTestJob } from './start-test-job';

export type PutStop = {
  jobId: string;
  visit: BookedVisit;
  crewId: string;
  /** Ten in the morning of the visit's day. */
  now: Date;
};

let week = 0;

/** An install of one day for the shop's own fitter, each time in another week; no room drawn. */
export async function putStop(shop: TestShop, jobId?: string): Promise<PutStop> {
  const { crewId } = await makeCrew(shop, 'fit');
  const id = jobId ?? (await startTestJob(shop)).jobId;
  const monday = new Date(Date.UTC(2027, 2, 1 + 7 * week));
  week += 1;
  const date = localDate(monday, 'UTC');
  const visit = await bookTestVisit(shop, {
    jobId: id,
    crewId,
    kind: 'install',
    date,
    time: '08:00',
    workMinutes: 6 * 60,
    overrideReason: 'tested without a release',
  });
  const { db } = await database();
  await db.update(jobs).set({ stage: 'installing' }).where(eq(jobs.id, id));
  return { jobId: id, visit, crewId, now: fromLocal(date, '10:00', shop.shop.zone) };
}

/** The same with a kitchen that was read, laid out and released. */
export async function putReleasedStop(
  shop: TestShop,
): Promise<PutStop & { kitchen: PutKitchen; releaseId: string }> {
  const kitchen = await putKitchen(shop);
  const ctx = await contextOf(shop, 'measurer', new Date());
  const fit = await getFit(ctx, { roomId: kitchen.roomId });
  const { releaseId } = await releaseSheet(ctx, {
    roomId: kitchen.roomId,
    overrideReason: 'a test',
    seenReadingIds: fit.fit.readingIds,
    seenRunsMark: fit.runsMark,
  });
  return { ...(await putStop(shop, kitchen.jobId)), kitchen, releaseId };
}

/** One tap, as a phone makes it. */
export const tap = <What extends string, More extends object>(
  { visit, now }: PutStop,
  what: What,
  more: More,
) => ({ id: randomUUID(), visitId: visit.id, at: now.toISOString(), what, ...more });

/** A signature that is a hook and a dot. */
export const testStrokes = [
  [
    [40, 120],
    [90, 60],
    [140, 150],
  ],
  [[200, 100]],
] as [number, number][][];

export const signing = {
  name: 'Robin Testwood',
  language: 'en' as const,
  statement: 'The cabinets are set. What is still open is listed here.',
  strokes: testStrokes,
  snags: [],
};
