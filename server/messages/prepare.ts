/** Everything that may have changed since a message was put into the outbox, looked at once more before it goes. */
import { and, eq, gt, inArray } from 'drizzle-orm';
import { messages } from '@/db/schema';
import { nextAllowedTime } from '@/lib/messages/quiet-hours';
import type { Context, SystemActor } from '@/server/base/context';
import type { Claimed } from './claim-due';
import type { Compose, Composed, LeftOut } from './compose';
import { byHand, composeByHand } from './compose-by-hand';
import { type Recipient, readRecipient } from './recipient';
import { zoneOfJob } from './zone-of-job';

export type Prepared =
  | { is: 'ready'; to: string; composed: Extract<Composed, { is: 'sms' | 'email' }> }
  | { is: 'later'; dueAt: Date }
  | { is: 'withdrawn' | 'refused'; reason: string };

export async function prepare(
  ctx: Context<SystemActor>,
  message: Claimed,
  compose: Compose,
): Promise<Prepared> {
  const { channel, notAfter } = message;
  if (ctx.shop.isSample) return withdrawn('This is a sample shop: nobody is told.');
  if (notAfter && notAfter < ctx.now) return withdrawn('Too late to be of use.');
  const recipient = await readRecipient(ctx.db, ctx.shop.id, message.customerId);
  const leftOut = recipient.decision.leftOut.find((entry) => entry.channel === channel);
  if (leftOut) return withdrawn(`The customer: ${leftOut.because}.`);
  if (channel === 'sms') {
    const dueAt = await allowedAt(ctx, message);
    if (!dueAt) return withdrawn('It could only have been sent at night or too late.');
    if (dueAt > ctx.now) return { is: 'later', dueAt };
  }
  const composed = await writeOut(ctx, message, { compose, recipient });
  if (composed.is === 'withdrawn' || composed.is === 'refused') return composed;
  return { is: 'ready', to: channel === 'sms' ? recipient.phone : recipient.email, composed };
}

/** By hand: as it was written. About a visit: from the visit as it is now. */
async function writeOut(
  ctx: Context<SystemActor>,
  message: Claimed,
  { compose, recipient }: { compose: Compose; recipient: Recipient },
): Promise<Composed> {
  if (message.occasion === byHand) return composeByHand(ctx, message, recipient);
  const { visitId } = message;
  if (!visitId) return { is: 'withdrawn', reason: 'It is about no visit.' };
  if (await isOvertaken(ctx, message)) return { is: 'withdrawn', reason: overtaken };
  const others = [];
  const leftOut: LeftOut[] = [];
  for (const other of message.others) {
    if (!other.visitId || (await isOvertaken(ctx, other))) {
      leftOut.push({ id: other.id, reason: overtaken });
    } else others.push({ ...other, visitId: other.visitId });
  }
  const composed = await compose(ctx, { ...message, visitId, others }, recipient);
  if (composed.is === 'withdrawn' || composed.is === 'refused') return composed;
  return { ...composed, leftOut: [...leftOut, ...(composed.leftOut ?? [])] };
}

const overtaken = 'The visit has changed since.';

function withdrawn(reason: string): Prepared {
  return { is: 'withdrawn', reason };
}

/** In the hours of the site, or of the shop where it is about no job. */
async function allowedAt(ctx: Context, message: Claimed): Promise<Date | null> {
  const zone = await zoneOfJob(ctx, message.jobId);
  const { quietFrom, quietUntil } = ctx.shop.rules.booking;
  const { notAfter } = message;
  return nextAllowedTime({ dueAt: ctx.now, zone, quietFrom, quietUntil, notAfter });
}

/** It was claimed before the visit moved or was called off: the newer message tells it all. */
async function isOvertaken(
  ctx: Context,
  message: Pick<Claimed, 'visitId' | 'channel' | 'createdAt'>,
): Promise<boolean> {
  if (!message.visitId) return false;
  const [newer] = await ctx.db
    .select({ id: messages.id })
    .from(messages)
    .where(
      and(
        eq(messages.shopId, ctx.shop.id),
        eq(messages.visitId, message.visitId),
        eq(messages.channel, message.channel),
        inArray(messages.occasion, ['moved', 'called-off']),
        gt(messages.createdAt, message.createdAt),
      ),
    )
    .limit(1);
  return newer !== undefined;
}
