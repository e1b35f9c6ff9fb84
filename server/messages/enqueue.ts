import type { Transaction } from '@/db/database';
import { messages } from '@/db/schema';
import type { MessageCause } from '@/lib/contracts/messages';
import type { Channel } from '@/lib/messages/consent';
import type { Occasion } from '@/lib/messages/occasions';
import { nextAllowedTime } from '@/lib/messages/quiet-hours';
import type { Context } from '@/server/base/context';
import { readMessageSettings } from './message-settings';
import type { Recipient } from './recipient';
import { findMoveToJoin } from './told-together';

export type Note = {
  occasion: Occasion;
  channel: Channel;
  dueAt: Date;
  /** Past this instant it is of no use. */
  notAfter: Date;
  cause?: MessageCause;
  /** What makes it one, instead of the visit's version: a later change of the visit tells it no second time. */
  once?: string;
};

export type Told = { jobId: string; visitId: string; version: number; zone: string };

/**
 * Puts notes into the outbox, in the transaction of their cause. A channel that the customer does not
 * allow, an occasion that the shop keeps silent on, and a text that could only go at night or too late, are
 * left out; a note of the same visit, version, occasion and channel is there already and stays one. Who
 * waits to be told of another visit's move is told of both together. Gives the channels that will be used.
 */
export async function enqueue(
  tx: Transaction,
  ctx: Context,
  to: { recipient: Recipient; about: Told },
  notes: Note[],
): Promise<Channel[]> {
  const { recipient, about } = to;
  const { silentOn } = await readMessageSettings(tx, ctx.shop.id);
  const rows = notes
    .filter(({ channel }) => recipient.decision.channels.includes(channel))
    .filter(({ occasion }) => !silentOn.includes(occasion))
    .flatMap((note) => {
      const dueAt = dueTime(ctx, about, note);
      return dueAt ? [rowOf(ctx, to, { ...note, dueAt })] : [];
    });
  for (const row of rows) {
    if (row.occasion === 'moved') row.toldWith = await findMoveToJoin(tx, row);
  }
  if (rows.length > 0) {
    await tx
      .insert(messages)
      .values(rows)
      .onConflictDoNothing({ target: [messages.shopId, messages.key] });
  }
  return [...new Set(rows.map(({ channel }) => channel))];
}

/** An e-mail wakes nobody; a text keeps to the site's day. */
function dueTime(ctx: Context, { zone }: Told, { channel, dueAt, notAfter }: Note): Date | null {
  if (channel === 'email') return dueAt > notAfter ? null : dueAt;
  const { quietFrom, quietUntil } = ctx.shop.rules.booking;
  return nextAllowedTime({ dueAt, zone, quietFrom, quietUntil, notAfter });
}

function rowOf(
  ctx: Context,
  { recipient, about }: { recipient: Recipient; about: Told },
  n: Note,
): typeof messages.$inferInsert {
  const { jobId, visitId, version } = about;
  const { occasion, channel, dueAt, notAfter, cause, once = version } = n;
  return {
    shopId: ctx.shop.id,
    customerId: recipient.customerId,
    jobId,
    visitId,
    occasion,
    channel,
    key: `${visitId}:${once}:${occasion}:${channel}`,
    dueAt,
    notAfter,
    cause: cause ?? {},
    createdAt: ctx.now,
  };
}
