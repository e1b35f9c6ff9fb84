import type { Transaction } from '@/db/database';
import type { ReportVisitInput } from '@/lib/contracts/visits';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import type { PersonContext } from '@/server/base/context';
import { putItem, settleItems } from '@/server/messages/scheduler-items';
import type { LockedVisit } from './lock-visit';
import { tellDone, tellMissed, tellOnMyWay } from './tell-from-site';
import { toldWords } from './visit-notes';

/** A tap that reaches us later than this is no news to the customer; what is over stays news for the day. */
const freshMinutes = { 'on-the-way': 15, 'nobody-home': 12 * 60, done: 24 * 60 } as const;

/** Who must know of a tap: the customer while it is news, the scheduler when somebody has to act. */
export async function tellTap(
  tx: Transaction,
  ctx: PersonContext,
  visit: LockedVisit,
  { what, at }: { what: Exclude<ReportVisitInput['what'], 'running-late'>; at: Date },
): Promise<void> {
  if (what === 'arrived') {
    const settledBy = 'The crew is there.';
    await settleItems(tx, ctx, { visitId: visit.id, settledBy, kinds: ['running-late'] });
    return;
  }
  const isFresh = ctx.now.getTime() - at.getTime() < freshMinutes[what] * 60_000;
  if (what === 'on-the-way' && isFresh) await tellOnMyWay(tx, ctx, visit);
  if (what === 'done' && isFresh) await tellDone(tx, ctx, visit, false);
  if (what !== 'nobody-home') return;
  const told = isFresh ? await tellMissed(tx, ctx, visit) : [];
  await putItem(tx, {
    shopId: ctx.shop.id,
    customerId: visit.customerId,
    jobId: visit.jobId,
    visitId: visit.id,
    kind: 'nobody-home',
    key: `nobody-home:${visit.id}`,
    words: `${visitKindWords[visit.kind]}: nobody was home; ${toldWords(told)}`,
    at,
  });
}
