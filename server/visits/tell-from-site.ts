/** What a crew's taps tell the customer, each while it is still of use. */
import { and, eq, ne } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { messages } from '@/db/schema';
import type { Channel } from '@/lib/messages/consent';
import type { Occasion } from '@/lib/messages/occasions';
import type { Context } from '@/server/base/context';
import { withdrawWaiting } from '@/server/messages/withdraw';
import { onEachChannel, putNotes, type ToldVisit } from './visit-notes';

const onMyWayMinutes = 60;
const missedHours = 12;
const doneDays = 3;

/** Tapped in the van: of use only until they are there. */
export async function tellOnMyWay(tx: Transaction, ctx: Context, visit: ToldVisit) {
  return tell(tx, ctx, visit, 'on-my-way', after(ctx.now, onMyWayMinutes * 60_000));
}

/** A later word takes the place of one that has not gone out; of use until the crew is there. */
export async function tellRunningLate(
  tx: Transaction,
  ctx: Context,
  visit: ToldVisit,
  expectedAt: Date,
) {
  await withdraw(tx, ctx, visit, ['running-late', 'on-my-way'], 'The crew said a later time.');
  return tell(tx, ctx, visit, 'running-late', expectedAt);
}

export async function tellMissed(tx: Transaction, ctx: Context, visit: ToldVisit) {
  await withdraw(tx, ctx, visit, ['on-my-way', 'running-late'], 'The crew has been there.');
  return tell(tx, ctx, visit, 'missed', after(ctx.now, missedHours * 3_600_000));
}

/**
 * The end of each visit is told once: when the crew is done, or with the copy of what was signed. Signed
 * first, the tap tells nothing more. Signed after a text has gone, no second text follows, since the page it
 * leads to shows the copy too; the e-mail with the copy goes out by itself. Two jobs of one customer end twice.
 */
export async function tellDone(tx: Transaction, ctx: Context, visit: ToldVisit, isSigned: boolean) {
  const notAfter = after(ctx.now, doneDays * 86_400_000);
  if (isSigned) await withdraw(tx, ctx, visit, ['done'], 'The signed copy tells it.');
  const told = await doneToldBy(tx, ctx, visit.id);
  if (!isSigned && told.length > 0) return [];
  const once = isSigned ? 'signed' : 'as it is';
  const notes = onEachChannel('done', { dueAt: ctx.now, notAfter }, { once });
  return putNotes(
    tx,
    ctx,
    visit,
    notes.filter(({ channel }) => channel === 'email' || !told.includes(channel)),
  );
}

async function doneToldBy(tx: Transaction, ctx: Context, visitId: string): Promise<Channel[]> {
  const told = await tx
    .select({ channel: messages.channel })
    .from(messages)
    .where(
      and(
        eq(messages.shopId, ctx.shop.id),
        eq(messages.visitId, visitId),
        eq(messages.occasion, 'done' satisfies Occasion),
        ne(messages.state, 'withdrawn'),
      ),
    );
  return told.map(({ channel }) => channel);
}

function tell(tx: Transaction, ctx: Context, visit: ToldVisit, occasion: Occasion, notAfter: Date) {
  return putNotes(tx, ctx, visit, onEachChannel(occasion, { dueAt: ctx.now, notAfter }));
}

function withdraw(
  tx: Transaction,
  ctx: Context,
  visit: ToldVisit,
  occasions: Occasion[],
  reason: string,
) {
  return withdrawWaiting(tx, ctx, { visitId: visit.id, occasions, reason });
}

const after = (instant: Date, ms: number) => new Date(instant.getTime() + ms);
