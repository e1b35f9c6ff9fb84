import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { jobs } from '@/db/schema';
import type { CustomerAnswerInput } from '@/lib/contracts/visits';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { writeAudit } from '@/server/base/audit';
import type { CustomerContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { changeVisit, type LockedVisit, lockVisit } from './lock-visit';

export type Answer = Omit<CustomerAnswerInput, 'token'>;

/** What a customer says about their one visit, from the page or by text. Said twice, it stays said once. */
export async function applyAnswer(
  tx: Transaction,
  ctx: CustomerContext,
  answer: Answer,
): Promise<void> {
  const visit = await lockVisit(tx, ctx, ctx.actor.visitId);
  if (!['held', 'booked', 'confirmed'].includes(visit.status)) throw tooLate();
  if (answer.answer === 'confirm') await confirm(tx, ctx, visit);
  else await ask(tx, ctx, visit, answer);
}

async function confirm(tx: Transaction, ctx: CustomerContext, visit: LockedVisit): Promise<void> {
  if (visit.status === 'confirmed') return;
  await changeVisit(tx, ctx, visit, {
    status: 'confirmed',
    confirmedAt: ctx.now,
    customerSays: '',
    holdEndsAt: null,
  });
  await tell(tx, ctx, visit, 'confirmed by the customer');
}

/** The visit stands, unconfirmed, until the office has found another time or the site is ready. */
async function ask(
  tx: Transaction,
  ctx: CustomerContext,
  visit: LockedVisit,
  answer: Answer,
): Promise<void> {
  const isNotReady = answer.answer === 'not-ready';
  const says = answer.words || (isNotReady ? 'Not ready' : 'Another time, please');
  await changeVisit(tx, ctx, visit, {
    status: 'booked',
    confirmedAt: null,
    customerSays: says,
  });
  if (isNotReady) {
    await tx
      .update(jobs)
      .set({ notReady: says })
      .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, visit.jobId)));
  }
  await tell(
    tx,
    ctx,
    visit,
    isNotReady ? `the customer is not ready: ${says}` : `the customer asks: ${says}`,
  );
}

function tell(
  tx: Transaction,
  ctx: CustomerContext,
  visit: LockedVisit,
  what: string,
): Promise<void> {
  return writeAudit(tx, ctx, {
    verb: 'answer-visit',
    subjectKind: 'visit',
    subjectId: visit.id,
    jobId: visit.jobId,
    summary: `${visitKindWords[visit.kind]}: ${what}`,
  });
}

function tooLate(): Refusal {
  return new Refusal({
    status: 409,
    code: 'visit-under-way-or-over',
    message: 'This visit is under way or over. Ring the shop.',
  });
}
