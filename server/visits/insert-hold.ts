import type { Transaction } from '@/db/database';
import { visits } from '@/db/schema';
import type { Context } from '@/server/base/context';

type NewHold = Pick<
  typeof visits.$inferInsert,
  | 'jobId'
  | 'kind'
  | 'crewId'
  | 'startsAt'
  | 'endsAt'
  | 'windowStartsAt'
  | 'windowEndsAt'
  | 'workMinutes'
> & {
  holdEndsAt: Date;
  /** The booked visit that it is held for, where it is held for one. */
  heldForVisitId: string | null;
};

/** The row of a held time, without its pieces; gives its id. */
export async function insertHold(tx: Transaction, ctx: Context, hold: NewHold): Promise<string> {
  const [held] = await tx
    .insert(visits)
    .values({ shopId: ctx.shop.id, status: 'held', ...hold })
    .returning({ id: visits.id });
  if (!held) throw new Error('the hold was not written');
  return held.id;
}
