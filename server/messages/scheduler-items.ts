/** The scheduler's list: what somebody of the office has to look at. */
import { and, eq, inArray, isNull } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { schedulerItems } from '@/db/schema';
import type { SchedulerItemKind } from '@/lib/contracts/messages';

export type NewItem = {
  shopId: string;
  customerId: string;
  jobId: string | null;
  visitId: string | null;
  kind: SchedulerItemKind;
  /** One cause is one item, however often it is heard. */
  key: string;
  words: string;
  at: Date;
};

export async function putItem(tx: Transaction, item: NewItem): Promise<void> {
  await tx
    .insert(schedulerItems)
    .values(item)
    .onConflictDoNothing({ target: [schedulerItems.shopId, schedulerItems.key] });
}

/** What moving a visit, calling it off or the customer's own yes answers; the rest stays until ticked off. */
const settledWithVisit: SchedulerItemKind[] = [
  'asks-other-time',
  'call-me',
  'not-ready',
  'time-taken',
  'no-answer',
  'running-late',
];

export async function settleItems(
  tx: Transaction,
  ctx: { shop: { id: string }; now: Date },
  of: { visitId: string; settledBy: string; kinds?: SchedulerItemKind[] },
): Promise<void> {
  await tx
    .update(schedulerItems)
    .set({ doneAt: ctx.now, doneBy: of.settledBy })
    .where(
      and(
        eq(schedulerItems.shopId, ctx.shop.id),
        eq(schedulerItems.visitId, of.visitId),
        inArray(schedulerItems.kind, of.kinds ?? settledWithVisit),
        isNull(schedulerItems.doneAt),
      ),
    );
}

/** What was settled at that moment was not: it is on the list again. */
export async function reopenItems(
  tx: Transaction,
  ctx: { shop: { id: string } },
  of: { visitId: string; at: Date },
): Promise<void> {
  await tx
    .update(schedulerItems)
    .set({ doneAt: null, doneBy: '' })
    .where(
      and(
        eq(schedulerItems.shopId, ctx.shop.id),
        eq(schedulerItems.visitId, of.visitId),
        eq(schedulerItems.doneAt, of.at),
      ),
    );
}
