/** What the customer is told when a visit is booked, moved or called off: each channel once, and only what is new there. */
import type { Transaction } from '@/db/database';
import type { MessageCause } from '@/lib/contracts/messages';
import { type Channel, channels } from '@/lib/messages/consent';
import type { Occasion } from '@/lib/messages/occasions';
import type { VisitKind } from '@/lib/schedule';
import { addDays } from '@/lib/time/civil';
import { fromLocal, localDate } from '@/lib/time/local-moment';
import type { Context } from '@/server/base/context';
import { enqueue, type Note } from '@/server/messages/enqueue';
import { readRecipient } from '@/server/messages/recipient';
import { withdrawWaiting } from '@/server/messages/withdraw';

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

export async function tellBooked(tx: Transaction, ctx: Context, visit: ToldVisit) {
  return put(tx, ctx, visit, [
    ...channels.map((channel) => at(ctx, visit, 'booked', channel)),
    ...reminders(ctx, visit),
  ]);
}

/**
 * What still waits for the old time is taken back. Where the booking itself had not been told yet, the new
 * time is simply booked; where a move had not, the customer still counts from the time before it.
 */
export async function tellMoved(
  tx: Transaction,
  ctx: Context,
  visit: ToldVisit,
  before: { windowStartsAt: Date; windowEndsAt: Date },
) {
  const untold = await takeBack(tx, ctx, visit.id, 'The visit was moved.');
  const cause = {
    toldFrom: before.windowStartsAt.toISOString(),
    toldUntil: before.windowEndsAt.toISOString(),
  };
  return put(tx, ctx, visit, [
    ...channels.map((channel) => {
      if (untold.booked.has(channel)) return at(ctx, visit, 'booked', channel);
      return at(ctx, visit, 'moved', channel, untold.moved.get(channel) ?? cause);
    }),
    ...reminders(ctx, visit),
  ]);
}

/** A visit that a channel never told of needs no calling off there. */
export async function tellCalledOff(
  tx: Transaction,
  ctx: Context,
  visit: ToldVisit,
  reason: string,
) {
  const untold = await takeBack(tx, ctx, visit.id, 'The visit was called off.');
  const cause = {
    toldFrom: visit.windowStartsAt.toISOString(),
    toldUntil: visit.windowEndsAt.toISOString(),
  };
  const notes = channels
    .filter((channel) => !untold.booked.has(channel))
    .map((channel) => {
      const told = untold.moved.get(channel) ?? cause;
      return at(ctx, visit, 'called-off', channel, { ...told, reason });
    });
  return put(tx, ctx, visit, notes);
}

/** Tapped in the van: of use only until they are there. */
export async function tellOnMyWay(tx: Transaction, ctx: Context, visit: ToldVisit) {
  return put(
    tx,
    ctx,
    visit,
    channels.map((channel) => ({
      ...at(ctx, visit, 'on-my-way', channel),
      notAfter: new Date(ctx.now.getTime() + onMyWayMinutes * 60_000),
    })),
  );
}

const onMyWayMinutes = 60;
/** Asked for a yes so many days before, at this local time; told again the day before. */
const askDaysBefore = (kind: VisitKind) => (kind === 'install' ? 7 : 2);
const askTime = '10:00';
const reminderTime = '16:00';
/** A reminder sooner after the booking than this would be the same thing twice. */
const leastHoursBetween = { 'please-confirm': 24, 'day-before': 3 } as const;

function reminders(ctx: Context, visit: ToldVisit): Note[] {
  const day = localDate(visit.windowStartsAt, visit.zone);
  const dueTimes = {
    'please-confirm': fromLocal(addDays(day, -askDaysBefore(visit.kind)), askTime, visit.zone),
    'day-before': fromLocal(addDays(day, -1), reminderTime, visit.zone),
  };
  return (['please-confirm', 'day-before'] as const).flatMap((occasion) => {
    const dueAt = dueTimes[occasion];
    const soonest = ctx.now.getTime() + leastHoursBetween[occasion] * 3_600_000;
    if (dueAt.getTime() < soonest) return [];
    return channels.map((channel) => ({ ...at(ctx, visit, occasion, channel), dueAt }));
  });
}

function at(
  ctx: Context,
  visit: ToldVisit,
  occasion: Occasion,
  channel: Channel,
  cause: MessageCause = {},
): Note {
  // An hour ahead of nothing is no use; a visit called off is told until it would have ended.
  const notAfter = occasion === 'called-off' ? visit.endsAt : visit.windowEndsAt;
  return { occasion, channel, dueAt: ctx.now, notAfter, cause };
}

async function takeBack(tx: Transaction, ctx: Context, visitId: string, reason: string) {
  const withdrawn = await withdrawWaiting(tx, ctx, { visitId, reason });
  const of = (occasion: Occasion) => withdrawn.filter((row) => row.occasion === occasion);
  return {
    booked: new Set(of('booked').map(({ channel }) => channel)),
    moved: new Map(of('moved').map(({ channel, cause }) => [channel, cause])),
  };
}

async function put(
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
