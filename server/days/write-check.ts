import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { visitChecks } from '@/db/schema';
import type { DayEventOf } from '@/lib/contracts/day-events';
import { checklistOf } from '@/lib/days/checklists';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { writeAudit } from '@/server/base/audit';
import type { PersonContext } from '@/server/base/context';
import { mustBeOwnRow } from './mark-once';
import type { OwnVisit } from './own-visit';

/** One line of the checklist; a "no" stands in the job's story, with what was said of it. */
export async function writeCheck(
  tx: Transaction,
  ctx: PersonContext,
  { event, visit, at }: { event: DayEventOf<'check'>; visit: OwnVisit; at: Date },
): Promise<void> {
  const { item, answer, words } = event;
  const [added] = await tx
    .insert(visitChecks)
    .values({
      shopId: ctx.shop.id,
      id: event.id,
      visitId: visit.id,
      item,
      answer,
      words,
      at,
      byPersonId: ctx.actor.personId,
    })
    .onConflictDoNothing({ target: visitChecks.id })
    .returning({ id: visitChecks.id });
  if (!added) {
    const [known] = await tx
      .select({ visitId: visitChecks.visitId })
      .from(visitChecks)
      .where(and(eq(visitChecks.shopId, ctx.shop.id), eq(visitChecks.id, event.id)));
    return mustBeOwnRow(known, visit.id);
  }
  if (answer !== 'no') return;
  const line = checklistOf(visit.kind, ctx.shop.rules.checklists).find(({ key }) => key === item);
  await writeAudit(tx, ctx, {
    verb: 'check',
    subjectKind: 'visit',
    subjectId: visit.id,
    jobId: visit.jobId,
    summary: `${visitKindWords[visit.kind]}, not so: ${line?.words.en ?? item}${words ? ` (${words})` : ''}`,
  });
}
