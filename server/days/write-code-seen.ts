import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { audit } from '@/db/schema';
import type { DayEventOf } from '@/lib/contracts/day-events';
import { writeAudit } from '@/server/base/audit';
import type { PersonContext } from '@/server/base/context';
import type { OwnVisit } from './own-visit';

const verb = 'see-access-code';

/** Each look at the code on a phone is in the story; the audit's own line tells a repeat. */
export async function writeCodeSeen(
  tx: Transaction,
  ctx: PersonContext,
  { event, visit, at }: { event: DayEventOf<'code-seen'>; visit: OwnVisit; at: Date },
): Promise<void> {
  const [known] = await tx
    .select({ id: audit.id })
    .from(audit)
    .where(and(eq(audit.shopId, ctx.shop.id), eq(audit.verb, verb), eq(audit.subjectId, event.id)));
  if (known) return;
  await writeAudit(tx, ctx, {
    verb,
    subjectKind: 'look',
    subjectId: event.id,
    jobId: visit.jobId,
    summary: 'Looked at the access code',
    detail: { visitId: visit.id, at: at.toISOString() },
  });
}
