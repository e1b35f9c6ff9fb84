/** Everything that may have changed since a message was put into the outbox, looked at once more before it goes. */
import { and, eq, gt, inArray } from 'drizzle-orm';
import { jobs, messages, sites, visits } from '@/db/schema';
import { nextAllowedTime } from '@/lib/messages/quiet-hours';
import type { Context, SystemActor } from '@/server/base/context';
import type { Claimed } from './claim-due';
import type { Compose, Composed } from './compose';
import { readRecipient } from './recipient';

export type Prepared =
  | { is: 'ready'; to: string; composed: Extract<Composed, { is: 'sms' | 'email' }> }
  | { is: 'later'; dueAt: Date }
  | { is: 'withdrawn' | 'refused'; reason: string };

export async function prepare(
  ctx: Context<SystemActor>,
  message: Claimed,
  compose: Compose,
): Promise<Prepared> {
  const { visitId, channel, notAfter } = message;
  if (!visitId) return withdrawn('It is about no visit.');
  if (notAfter && notAfter < ctx.now) return withdrawn('Too late to be of use.');
  const recipient = await readRecipient(ctx.db, ctx.shop.id, message.customerId);
  const leftOut = recipient.decision.leftOut.find((entry) => entry.channel === channel);
  if (leftOut) return withdrawn(`The customer: ${leftOut.because}.`);
  if (channel === 'sms') {
    const dueAt = await allowedAt(ctx, visitId, notAfter);
    if (!dueAt) return withdrawn('It could only have been sent at night or too late.');
    if (dueAt > ctx.now) return { is: 'later', dueAt };
  }
  if (await isOvertaken(ctx, message)) return withdrawn('The visit has changed since.');
  const composed = await compose(ctx, { ...message, visitId }, recipient);
  if (composed.is === 'withdrawn' || composed.is === 'refused') return composed;
  return { is: 'ready', to: channel === 'sms' ? recipient.phone : recipient.email, composed };
}

function withdrawn(reason: string): Prepared {
  return { is: 'withdrawn', reason };
}

async function allowedAt(
  ctx: Context,
  visitId: string,
  notAfter: Date | null,
): Promise<Date | null> {
  const [site] = await ctx.db
    .select({ zone: sites.zone })
    .from(visits)
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(and(eq(visits.shopId, ctx.shop.id), eq(visits.id, visitId)));
  const { quietFrom, quietUntil } = ctx.shop.rules.booking;
  const zone = site?.zone ?? ctx.shop.zone;
  return nextAllowedTime({ dueAt: ctx.now, zone, quietFrom, quietUntil, notAfter });
}

/** It was claimed before the visit moved or was called off: the newer message tells it all. */
async function isOvertaken(ctx: Context, message: Claimed): Promise<boolean> {
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
