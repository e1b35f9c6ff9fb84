import type { FitView } from '@/lib/contracts/rooms';
import { fitRoom } from '@/lib/measure/fit-room';
import { whatIsMissing } from '@/lib/measure/what-is-missing';
import { sheetChanges } from '@/lib/sheet/sheet-changes';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { momentWords } from '@/server/walls/moment-words';
import { readWallBook } from '@/server/walls/read-wall-book';
import { runsMark } from '@/server/walls/runs-mark';
import { readNewestFrozen, readReleases } from './read-releases';

/** What the readings mean for the runs; worked out every time it is asked for, and never stored. */
export async function getFit(ctx: PersonContext, { roomId }: { roomId: string }): Promise<FitView> {
  mustBeAllowed(ctx, 'sheets:read');
  const book = await readWallBook(ctx.db, ctx, roomId);
  const { wallBook, runs, jobId, jobTitle, customerName, street } = book;
  const rules = ctx.shop.rules.fit;
  const fit = fitRoom(wallBook, runs, rules);
  const newest = await readNewestFrozen(ctx.db, ctx, roomId);
  return {
    jobId,
    jobTitle,
    customerName,
    street,
    wallBook,
    runs,
    runsMark: runsMark(runs),
    rules,
    fit,
    missing: whatIsMissing(wallBook, runs, rules),
    takenBy: Object.fromEntries(
      wallBook.readings.map(({ id, takenAt }) => [
        id,
        `${book.takenBy.get(id)}, ${momentWords(ctx, new Date(takenAt))}`,
      ]),
    ),
    releases: await readReleases(ctx.db, ctx, roomId),
    changesSinceRelease: newest ? sheetChanges(newest, { wallBook, runs, rules, fit }) : null,
  };
}
