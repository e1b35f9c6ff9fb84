import type { Transaction } from '@/db/database';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { formatTime } from '@/lib/time/format-instant';
import { writeAudit } from '@/server/base/audit';
import type { PersonContext } from '@/server/base/context';
import { putItem } from '@/server/messages/scheduler-items';
import { changeVisit, type LockedVisit } from './lock-visit';
import { tellRunningLate } from './tell-from-site';
import { toldWords } from './visit-notes';

/**
 * The crew says how long after the promised window they will be there. A tap that reaches us when even that
 * time is past, or the crew is there, is no news; the same word twice is one.
 */
export async function runLate(
  tx: Transaction,
  ctx: PersonContext,
  before: LockedVisit,
  lateMinutes: number,
): Promise<void> {
  const expectedAt = new Date(before.windowEndsAt.getTime() + lateMinutes * 60_000);
  const isStillAwaited = ['held', 'booked', 'confirmed', 'on-the-way'].includes(before.status);
  if (!isStillAwaited || expectedAt <= ctx.now) return;
  if (before.expectedAt?.getTime() === expectedAt.getTime()) return;
  const visit = await changeVisit(tx, ctx, before, { expectedAt });
  const told = await tellRunningLate(tx, ctx, visit, expectedAt);
  const time = formatTime(expectedAt, visit.zone, { language: 'en', region: ctx.shop.region });
  const summary = `${visitKindWords[visit.kind]}: running about ${lateMinutes} minutes late, there at about ${time}; ${toldWords(told)}`;
  await putItem(tx, {
    shopId: ctx.shop.id,
    customerId: visit.customerId,
    jobId: visit.jobId,
    visitId: visit.id,
    kind: 'running-late',
    key: `running-late:${visit.id}:${expectedAt.toISOString()}`,
    words: summary,
    at: ctx.now,
  });
  await writeAudit(tx, ctx, {
    verb: 'report-visit',
    subjectKind: 'visit',
    subjectId: visit.id,
    jobId: visit.jobId,
    summary,
    detail: { what: 'running-late', lateMinutes, expectedAt, told },
  });
}
