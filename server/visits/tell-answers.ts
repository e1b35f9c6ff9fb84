/** Answers to what a customer says: by themselves, few, and never in a loop. */
import { and, eq, gt, inArray } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { customers, messages } from '@/db/schema';
import type { MessageCause } from '@/lib/contracts/messages';
import { type MissingThing, missingWords } from '@/lib/messages/missing-words';
import { textAnswers } from '@/lib/messages/occasions';
import type { Context } from '@/server/base/context';
import { onEachChannel, putNotes, type ToldVisit } from './visit-notes';

/** Automatic texts to one customer in a day; past it a person reads what they write. */
const mostAnswersADay = 3;
const dayMs = 86_400_000;

/** Their own words back to them, in their language. */
export async function tellNotReady(
  tx: Transaction,
  ctx: Context,
  visit: ToldVisit,
  said: { missing: readonly MissingThing[]; words: string },
) {
  const [customer] = await tx
    .select({ language: customers.language })
    .from(customers)
    .where(and(eq(customers.shopId, ctx.shop.id), eq(customers.id, visit.customerId)));
  const language = customer?.language ?? 'en';
  const fallback = language === 'es' ? 'todavía no' : 'not yet';
  const reason = missingWords(said.missing, said.words, language) || fallback;
  const times = { dueAt: ctx.now, notAfter: visit.windowEndsAt };
  return putNotes(tx, ctx, visit, onEachChannel('not-ready', times, { cause: { reason } }));
}

/** Answers a text with one of ours; false when it may not, so that a person does. */
export async function answerText(
  tx: Transaction,
  ctx: Context,
  visit: ToldVisit,
  answer: {
    occasion: (typeof textAnswers)[number];
    /** The provider's id of the text that is answered: each is answered once. */
    inboundId: string;
    cause?: MessageCause;
  },
): Promise<boolean> {
  const { occasion, inboundId, cause = {} } = answer;
  const sinceYesterday = new Date(ctx.now.getTime() - dayMs);
  const answered = await tx.$count(
    messages,
    and(
      eq(messages.shopId, ctx.shop.id),
      eq(messages.customerId, visit.customerId),
      inArray(messages.occasion, [...textAnswers]),
      gt(messages.createdAt, sinceYesterday),
    ),
  );
  if (answered >= mostAnswersADay) return false;
  const times = { dueAt: ctx.now, notAfter: new Date(ctx.now.getTime() + dayMs) };
  const once = `in:${inboundId}`;
  const told = await putNotes(tx, ctx, visit, onEachChannel(occasion, times, { cause, once }));
  return told.length > 0;
}
