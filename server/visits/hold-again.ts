import type { Transaction } from '@/db/database';
import type { visits } from '@/db/schema';
import type { Context } from '@/server/base/context';
import { insertHold } from './insert-hold';
import { lockCrew } from './lock-crew';
import type { VisitStanding } from './visit-standing';
import { writePieces } from './write-pieces';

type TakenHold = {
  jobId: string;
  kind: (typeof visits.$inferSelect)['kind'];
  /** The time as the visit had it when the hold had been taken. */
  stood: VisitStanding;
  holdEndsAt: Date;
  /** The booked visit that it was held for, where it was held for one. */
  forVisitId: string | null;
};

/**
 * A held time whose taking is taken back is held once more, until its quarter of an hour ends: the customer is
 * still on the phone. False where that is over. The time must be free by now.
 */
export async function holdAgain(tx: Transaction, ctx: Context, hold: TakenHold): Promise<boolean> {
  const { jobId, kind, holdEndsAt, stood } = hold;
  if (holdEndsAt <= ctx.now) return false;
  const { crewId, startsAt, endsAt, windowStartsAt, windowEndsAt, workMinutes, pieces } = stood;
  const crew = await lockCrew(tx, ctx, crewId);
  const visitId = await insertHold(tx, ctx, {
    jobId,
    kind,
    crewId,
    holdEndsAt,
    heldForVisitId: hold.forVisitId,
    ...{ startsAt, endsAt, windowStartsAt, windowEndsAt, workMinutes },
  });
  await writePieces(tx, ctx, { visitId, crew, pieces });
  return true;
}
