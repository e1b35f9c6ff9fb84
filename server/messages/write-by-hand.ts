import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { customers, jobs, messages } from '@/db/schema';
import type { WriteByHandInput, WrittenByHand } from '@/lib/contracts/messages';
import { nextAllowedTime } from '@/lib/messages/quiet-hours';
import { formatDayShort, formatTime } from '@/lib/time/format-instant';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { onlyOnce } from '@/server/base/only-once';
import { notFound, Refusal } from '@/server/base/problem-response';
import { byHand } from './compose-by-hand';
import { readRecipient } from './recipient';
import { kickWorker } from './worker';
import { zoneOfJob } from './zone-of-job';

/** A reply in somebody's own words: by a channel that the customer allows, and by day. */
export async function writeByHand(
  ctx: PersonContext,
  input: WriteByHandInput,
): Promise<WrittenByHand> {
  mustBeAllowed(ctx, 'messages:send');
  const written = await ctx.db.transaction((tx) =>
    onlyOnce(tx, ctx, { verb: 'write-by-hand', key: input.idempotencyKey }, () =>
      write(tx, ctx, input),
    ),
  );
  kickWorker();
  return written;
}

async function write(
  tx: Transaction,
  ctx: PersonContext,
  input: WriteByHandInput,
): Promise<WrittenByHand> {
  const { customerId, jobId, channel, text, subject } = input;
  await mustBeTheirs(tx, ctx, input);
  const recipient = await readRecipient(tx, ctx.shop.id, customerId);
  const leftOut = recipient.decision.leftOut.find((entry) => entry.channel === channel);
  if (leftOut) throw notAllowed(leftOut.because);
  const zone = await zoneOfJob(ctx, jobId, tx);
  const { quietFrom, quietUntil } = ctx.shop.rules.booking;
  const byDay = nextAllowedTime({ dueAt: ctx.now, zone, quietFrom, quietUntil, notAfter: null });
  const dueAt = channel === 'sms' && byDay ? byDay : ctx.now;
  const [row] = await tx
    .insert(messages)
    .values({
      shopId: ctx.shop.id,
      customerId,
      jobId,
      occasion: byHand,
      channel,
      key: `${byHand}:${input.idempotencyKey}`,
      dueAt,
      cause: { text, ...(subject ? { subject } : {}) },
      body: text,
      writtenBy: ctx.actor.personId,
      createdAt: ctx.now,
    })
    .returning({ id: messages.id });
  if (!row) throw new Error('the message was not written');
  if (jobId) {
    await writeAudit(tx, ctx, {
      verb: 'write-by-hand',
      subjectKind: 'message',
      subjectId: row.id,
      jobId,
      summary: `Wrote to ${recipient.name} by ${channel === 'sms' ? 'text' : 'e-mail'}`,
    });
  }
  const locale = { language: 'en', region: ctx.shop.region } as const;
  const later = `${formatDayShort(dueAt, zone, locale)}, ${formatTime(dueAt, zone, locale)}: it is night at the site`;
  return { id: row.id, goesOut: dueAt > ctx.now ? later : 'at once' };
}

async function mustBeTheirs(
  tx: Transaction,
  ctx: PersonContext,
  { customerId, jobId }: WriteByHandInput,
): Promise<void> {
  const [customer] = await tx
    .select({ id: customers.id })
    .from(customers)
    .where(and(eq(customers.shopId, ctx.shop.id), eq(customers.id, customerId)));
  if (!customer) throw notFound('customer');
  if (!jobId) return;
  const [job] = await tx
    .select({ id: jobs.id })
    .from(jobs)
    .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId), eq(jobs.customerId, customerId)));
  if (!job) throw notFound('job');
}

function notAllowed(because: string): Refusal {
  return new Refusal({
    status: 409,
    code: 'channel-not-allowed',
    message: `Not sent: ${because}. Take the other way, or ring them.`,
  });
}
