import type { WallBookView } from '@/lib/contracts/rooms';
import { whatIsMissing } from '@/lib/measure/what-is-missing';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { readWallBook } from './read-wall-book';

/** Everything a phone needs to measure one room, with no signal for the rest of the day. */
export async function getWallBook(
  ctx: PersonContext,
  { roomId }: { roomId: string },
): Promise<WallBookView> {
  mustBeAllowed(ctx, 'walls:read');
  const book = await readWallBook(ctx.db, ctx, roomId);
  const { jobId, jobTitle, customerName, wallBook, runs, submittedAt, readers } = book;
  const rules = ctx.shop.rules.fit;
  return {
    jobId,
    jobTitle,
    customerName,
    wallBook,
    runs,
    rules,
    missing: whatIsMissing(wallBook, runs, rules),
    tools: wallBook.tools,
    submittedAt: submittedAt?.toISOString() ?? null,
    readers,
  };
}
