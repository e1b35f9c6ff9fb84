/** Notes about a visit on their way to the outbox: to whom, by which channel, until when they are of use. */
import type { Transaction } from '@/db/database';
import type { MessageCause } from '@/lib/contracts/messages';
import { type Channel, channels } from '@/lib/messages/consent';
import { isTextAnswer, type Occasion } from '@/lib/messages/occasions';
import type { VisitKind } from '@/lib/schedule';
import type { Context } from '@/server/base/context';
import { enqueue, type Note } from '@/server/messages/enqueue';
import { readRecipient } from '@/server/messages/recipient';

export type ToldVisit = {
  id: string;
  jobId: string;
  kind: VisitKind;
  version: number;
  customerId: string;
  /** Of the site. */
  zone: string;
  endsAt: Date;
  windowStartsAt: Date;
  windowEndsAt: Date;
};

/** One note for each channel; an answer to a text is a text. */
export function onEachChannel(
  occasion: Occasion,
  times: { dueAt: Date; notAfter: Date },
  more: { cause?: MessageCause; once?: string } = {},
): Note[] {
  const by: readonly Channel[] = isTextAnswer(occasion) ? ['sms'] : channels;
  return by.map((channel) => ({ occasion, channel, ...times, ...more }));
}

/** Puts notes into the outbox; gives the channels by which the customer will be told. */
export async function putNotes(
  tx: Transaction,
  ctx: Context,
  visit: ToldVisit,
  notes: Note[],
): Promise<Channel[]> {
  const recipient = await readRecipient(tx, ctx.shop.id, visit.customerId);
  const { id: visitId, jobId, version, zone } = visit;
  return enqueue(tx, ctx, { recipient, about: { visitId, jobId, version, zone } }, notes);
}

/** For the job's story. */
export function toldWords(told: Channel[]): string {
  if (told.length === 0) return 'the customer is not told: call them';
  const words = { sms: 'text', email: 'e-mail' } as const;
  return `the customer is told by ${told.map((channel) => words[channel]).join(' and ')}`;
}
