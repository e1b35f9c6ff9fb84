import type { Transaction } from '@/db/database';
import { audit } from '@/db/schema';
import type { Context } from './context';

/** One line of a job's story, written in the transaction of what it tells. */
export async function writeAudit(
  tx: Transaction,
  ctx: Context,
  line: {
    verb: string;
    subjectKind: string;
    subjectId: string;
    jobId?: string;
    summary: string;
    detail?: Record<string, unknown>;
  },
): Promise<void> {
  await tx.insert(audit).values({
    shopId: ctx.shop.id,
    at: ctx.now,
    actorKind: ctx.actor.kind,
    actorName: ctx.actor.name,
    ...line,
  });
}
