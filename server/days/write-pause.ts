import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { visitPauses } from '@/db/schema';
import type { DayEventOf, PauseReason } from '@/lib/contracts/day-events';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { writeAudit } from '@/server/base/audit';
import type { PersonContext } from '@/server/base/context';
import { mustBeOwnRow } from './mark-once';
import type { OwnVisit } from './own-visit';

const why: Record<PauseReason, string> = {
  break: 'a break',
  parts: 'gone for parts',
  'for-the-day': 'done for the day',
  other: 'a pause',
};

/** Work rests, or goes on. */
export async function writePause(
  tx: Transaction,
  ctx: PersonContext,
  told: { event: DayEventOf<'pause'> | DayEventOf<'go-on'>; visit: OwnVisit; at: Date },
): Promise<void> {
  const { event, visit, at } = told;
  const [added] = await tx
    .insert(visitPauses)
    .values({
      shopId: ctx.shop.id,
      id: event.id,
      visitId: visit.id,
      what: event.what,
      why: event.what === 'pause' ? event.why : null,
      at,
      byPersonId: ctx.actor.personId,
    })
    .onConflictDoNothing({ target: visitPauses.id })
    .returning({ id: visitPauses.id });
  if (!added) {
    const [known] = await tx
      .select({ visitId: visitPauses.visitId })
      .from(visitPauses)
      .where(and(eq(visitPauses.shopId, ctx.shop.id), eq(visitPauses.id, event.id)));
    return mustBeOwnRow(known, visit.id);
  }
  await writeAudit(tx, ctx, {
    verb: event.what,
    subjectKind: 'visit',
    subjectId: visit.id,
    jobId: visit.jobId,
    summary: `${visitKindWords[visit.kind]}: ${event.what === 'pause' ? why[event.why] : 'at work again'}`,
    detail: { at },
  });
}
