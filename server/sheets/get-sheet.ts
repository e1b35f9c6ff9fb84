import type { SheetView } from '@/lib/contracts/rooms';
import { isOldHouse } from '@/lib/measure/rules/old-house';
import { revisionMarks } from '@/lib/sheet/revision-marks';
import { supersededBy } from '@/lib/sheet/sheet-changes';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { readWallBook } from '@/server/walls/read-wall-book';
import { measuredWords } from './measured-words';
import { readFrozen, readReleases } from './read-releases';

/** A released sheet as it was frozen, and what has happened in the room since. */
export async function getSheet(
  ctx: PersonContext,
  { roomId, revision }: { roomId: string; revision: string },
): Promise<SheetView> {
  mustBeAllowed(ctx, 'sheets:read');
  const now = await readWallBook(ctx.db, ctx, roomId);
  const all = await readReleases(ctx.db, ctx, roomId);
  const release = all.find((row) => row.revision === revision);
  const frozen = await readFrozen(ctx.db, ctx, { roomId, revision });
  if (!release || !frozen) throw notFound('sheet');
  const { jobId, jobNumber, jobTitle, customerName, street, yearBuilt } = now;
  const newest = all[0]?.revision ?? revision;
  const before = all[all.findIndex((row) => row.revision === revision) + 1]?.revision;
  const older = before ? await readFrozen(ctx.db, ctx, { roomId, revision: before }) : null;
  return {
    ...frozen,
    release,
    jobId,
    jobNumber,
    jobTitle,
    customerName,
    street,
    shopName: ctx.shop.name,
    roomName: frozen.wallBook.room.name,
    measuredWords: measuredWords(ctx, now, frozen.fit.readingIds),
    isOldHouse: isOldHouse(yearBuilt, ctx.shop.region),
    revised: older ? { revision, marks: revisionMarks(older, frozen) } : null,
    newerRevision: newest === revision ? null : newest,
    supersededBy: supersededBy(frozen, now, frozen.rules.unit, frozen.rules.region),
  };
}
