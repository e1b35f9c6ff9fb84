import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { jobs } from '@/db/schema';
import type { SchedulerItemKind } from '@/lib/contracts/messages';
import type { CustomerAnswerInput } from '@/lib/contracts/visits';
import { callMeWords, notReadyWords, otherTimeWords } from '@/lib/messages/said-words';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { writeAudit } from '@/server/base/audit';
import type { CustomerContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { putItem, settleItems } from '@/server/messages/scheduler-items';
import { changeVisit, type LockedVisit, lockVisit } from './lock-visit';
import { tellNotReady } from './tell-answers';

export type Answer = Omit<CustomerAnswerInput, 'token'>;

/** What a customer says about their one visit, from the page or by text. Said twice, it stays said once. */
export async function applyAnswer(
  tx: Transaction,
  ctx: CustomerContext,
  answer: Answer,
): Promise<LockedVisit> {
  const visit = await lockVisit(tx, ctx, ctx.actor.visitId);
  if (!['held', 'booked', 'confirmed'].includes(visit.status)) throw tooLate();
  switch (answer.answer) {
    case 'confirm':
      return confirm(tx, ctx, visit);
    case 'ready-now':
      return ready(tx, ctx, visit);
    case 'not-ready':
      return notReady(tx, ctx, visit, answer);
    case 'call-me':
      return ask(tx, ctx, visit, { kind: 'call-me', says: callMeWords(answer.words) });
    case 'another-time':
      return ask(tx, ctx, visit, {
        kind: 'asks-other-time',
        says: otherTimeWords(answer.words),
      });
  }
}

async function confirm(
  tx: Transaction,
  ctx: CustomerContext,
  visit: LockedVisit,
): Promise<LockedVisit> {
  if (visit.status === 'confirmed') return visit;
  const change = { status: 'confirmed', customerSays: '', holdEndsAt: null } as const;
  const confirmed = await changeVisit(tx, ctx, visit, { ...change, confirmedAt: ctx.now });
  const settledBy = 'The customer confirmed.';
  await settleItems(tx, ctx, {
    visitId: visit.id,
    settledBy,
    kinds: ['no-answer', 'asks-other-time', 'call-me'],
  });
  await tell(tx, ctx, visit, 'confirmed by the customer');
  return confirmed;
}

/** The visit stands, unconfirmed, until the office has found another time or the site is ready. */
async function ask(
  tx: Transaction,
  ctx: CustomerContext,
  visit: LockedVisit,
  { kind, says }: { kind: SchedulerItemKind; says: string },
): Promise<LockedVisit> {
  if (visit.status === 'booked' && visit.customerSays === says) return visit;
  const change = { status: 'booked', confirmedAt: null, customerSays: says } as const;
  const asked = await changeVisit(tx, ctx, visit, change);
  await putItem(tx, {
    shopId: ctx.shop.id,
    customerId: visit.customerId,
    jobId: visit.jobId,
    visitId: visit.id,
    kind,
    key: `${kind}:${visit.id}:${asked.version}`,
    words: `${visitKindWords[visit.kind]}: ${says}`,
    at: ctx.now,
  });
  await tell(tx, ctx, visit, `the customer asks: ${says}`);
  return asked;
}

async function notReady(
  tx: Transaction,
  ctx: CustomerContext,
  visit: LockedVisit,
  { missing, words }: Answer,
): Promise<LockedVisit> {
  const says = notReadyWords(missing, words);
  if (visit.customerSays === says) return visit;
  const asked = await ask(tx, ctx, visit, { kind: 'not-ready', says });
  await writeNotReady(tx, ctx, visit.jobId, says);
  await tellNotReady(tx, ctx, asked, { missing, words });
  return asked;
}

async function ready(
  tx: Transaction,
  ctx: CustomerContext,
  visit: LockedVisit,
): Promise<LockedVisit> {
  if (visit.customerSays === '') return visit;
  const is = await changeVisit(tx, ctx, visit, { customerSays: '' });
  await writeNotReady(tx, ctx, visit.jobId, '');
  await settleItems(tx, ctx, {
    visitId: visit.id,
    settledBy: 'The customer says that it is ready.',
    kinds: ['not-ready'],
  });
  await tell(tx, ctx, visit, 'the customer says that it is ready');
  return is;
}

/** The gate of the job: nothing more is booked for it while something is missing. */
async function writeNotReady(
  tx: Transaction,
  ctx: CustomerContext,
  jobId: string,
  notReady: string,
): Promise<void> {
  await tx
    .update(jobs)
    .set({ notReady })
    .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId)));
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
