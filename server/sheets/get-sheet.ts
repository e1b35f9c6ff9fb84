import { and, eq } from 'drizzle-orm';
import { releases } from '@/db/schema';
import type { SheetView } from '@/lib/contracts/rooms';
import { isOldHouse } from '@/lib/measure/rules/old-house';
import { supersededBy } from '@/lib/sheet/sheet-changes';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { readWallBook } from '@/server/walls/read-wall-book';
import { measuredWords } from './measured-words';
import { readReleases } from './read-releases';

/** A released sheet as it was frozen, and what has happened in the room since. */
export async function getSheet(
  ctx: PersonContext,
  { roomId, revision }: { roomId: string; revision: string },
): Promise<SheetView> {
  mustBeAllowed(ctx, 'sheets:read');
  const now = await readWallBook(ctx.db, ctx, roomId);
  const all = await readReleases(ctx.db, ctx, roomId);
  const release = all.find((row) => row.revision === revision);
  const [frozen] = await ctx.db
    .select({
      overrideReason: releases.overrideReason,
      engineVersion: releases.engineVersion,
      wallBook: releases.wallBook,
      runs: releases.runs,
      rules: releases.rules,
      fit: releases.fit,
    })
    .from(releases)
    .where(
      and(
        eq(releases.shopId, ctx.shop.id),
        eq(releases.roomId, roomId),
        eq(releases.revision, revision),
      ),
    );
  if (!release || !frozen) throw notFound('sheet');
  const { jobId, jobNumber, jobTitle, customerName, street, yearBuilt } = now;
  const newest = all[0]?.revision ?? revision;
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
    newerRevision: newest === revision ? null : newest,
    supersededBy: supersededBy(frozen, now, frozen.rules.unit),
  };
}
