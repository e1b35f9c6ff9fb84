import type { Transaction } from '@/db/database';
import { localDate } from '@/lib/time/local-moment';
import type { Context } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import type { Crew } from './lock-crew';
import { changeVisit, type LockedVisit } from './lock-visit';
import type { Plan } from './plan-visit';
import { tellMoved } from './tell-customer';
import { keepVisitLink } from './visit-link';
import { writePieces } from './write-pieces';

export type Move = { before: LockedVisit; crew: Crew; plan: Plan };

/**
 * Puts a locked visit where the plan has it, and tells the customer where that is news: a time that they were
 * not told of has to be confirmed anew.
 */
export async function writeMove(tx: Transaction, ctx: Context, { before, crew, plan }: Move) {
  const isNews = changesWhatWasTold(ctx, before, plan);
  const { startsAt, endsAt, windowStartsAt, windowEndsAt, workMinutes, pieces } = plan;
  const after = await changeVisit(tx, ctx, before, {
    crewId: crew.id,
    startsAt,
    endsAt,
    windowStartsAt,
    windowEndsAt,
    workMinutes,
    ...(isNews ? { status: 'booked', confirmedAt: null, expectedAt: null, customerSays: '' } : {}),
  });
  await writePieces(tx, ctx, { visitId: after.id, crew, pieces });
  await keepVisitLink(tx, ctx, { visitId: after.id, endsAt });
  const told = isNews ? await tellMoved(tx, ctx, after, before) : null;
  return { after, told };
}

/** A held time is taken or let go, never moved; a visit under way stays where it is. */
export function mustBeMovable(visit: LockedVisit): void {
  if (visit.status === 'booked' || visit.status === 'confirmed') return;
  if (visit.status === 'held') {
    throw new Refusal({
      status: 409,
      code: 'visit-only-held',
      message:
        'Nothing was changed: this time is only held. Take it or let it go, then hold another.',
    });
  }
  throw new Refusal({
    status: 409,
    code: 'visit-under-way-or-over',
    message: 'Nothing was changed: this visit is under way or over. Book another one.',
  });
}

/** The customer knows the arrival and the last day; another crew or an hour more is no news to them. */
function changesWhatWasTold(ctx: Context, before: LockedVisit, plan: Plan): boolean {
  const lastDay = (endsAt: Date) => localDate(new Date(endsAt.getTime() - 1), ctx.shop.zone);
  return (
    before.windowStartsAt.getTime() !== plan.windowStartsAt.getTime() ||
    before.windowEndsAt.getTime() !== plan.windowEndsAt.getTime() ||
    lastDay(before.endsAt) !== lastDay(plan.endsAt)
  );
}
