/** What the customer is told when a visit is booked, moved or called off: each channel once, and only what is new there. */
import type { Transaction } from '@/db/database';
import type { MessageCause } from '@/lib/contracts/messages';
import { type Channel, channels } from '@/lib/messages/consent';
import type { Occasion } from '@/lib/messages/occasions';
import type { VisitKind } from '@/lib/schedule';
import { addDays } from '@/lib/time/civil';
import { fromLocal, localDate } from '@/lib/time/local-moment';
import type { Context } from '@/server/base/context';
import type { Note } from '@/server/messages/enqueue';
import { settleItems } from '@/server/messages/scheduler-items';
import { withdrawWaiting } from '@/server/messages/withdraw';
import { onEachChannel, putNotes, type ToldVisit } from './visit-notes';

export { toldWords } from './visit-notes';

/** Office hands may take a booking, a move or a calling off back for so long before anybody is told. */
export const undoMs = 12_000;

export async function tellBooked(tx: Transaction, ctx: Context, visit: ToldVisit) {
  return putNotes(tx, ctx, visit, [
    ...channels.map((channel) => news(ctx, visit, 'booked', channel)),
    ...reminders(ctx, visit),
  ]);
}

/**
 * What still waits for the old time is taken back. Where the booking itself had not been told yet, the new
 * time is simply booked; where a move had not, the customer still counts from the time before it, and hears
 * nothing when the visit is back there.
 */
export async function tellMoved(
  tx: Transaction,
  ctx: Context,
  visit: ToldVisit,
  before: { windowStartsAt: Date; windowEndsAt: Date },
) {
  const untold = await takeBack(tx, ctx, visit.id, 'The visit was moved.');
  await settleItems(tx, ctx, { visitId: visit.id, settledBy: 'The visit was moved.' });
  const cause = toldTimes(before);
  return putNotes(tx, ctx, visit, [
    ...channels.flatMap((channel) => {
      if (untold.booked.has(channel)) return [news(ctx, visit, 'booked', channel)];
      return movedFrom(ctx, visit, channel, untold.moved.get(channel) ?? cause);
    }),
    ...reminders(ctx, visit),
  ]);
}

/**
 * A calling off is taken back. Who has not heard of it hears nothing, unless the time is another than they
 * know; who has, is told that the visit is booked.
 */
export async function tellStandsAgain(tx: Transaction, ctx: Context, visit: ToldVisit) {
  const untold = await takeBack(tx, ctx, visit.id, 'The visit stands again.');
  return putNotes(tx, ctx, visit, [
    ...channels.flatMap((channel) => {
      const told = untold.calledOff.get(channel);
      if (!told) return [news(ctx, visit, 'booked', channel)];
      return movedFrom(ctx, visit, channel, told);
    }),
    ...reminders(ctx, visit),
  ]);
}

/** Nothing, when the visit is where the customer knows it. */
function movedFrom(ctx: Context, visit: ToldVisit, channel: Channel, told: MessageCause): Note[] {
  const now = toldTimes(visit);
  const isKnown = told.toldFrom === now.toldFrom && told.toldUntil === now.toldUntil;
  return isKnown ? [] : [news(ctx, visit, 'moved', channel, told)];
}

/** A visit that a channel never told of needs no calling off there. */
export async function tellCalledOff(
  tx: Transaction,
  ctx: Context,
  visit: ToldVisit,
  reason: string,
) {
  const untold = await takeBack(tx, ctx, visit.id, 'The visit was called off.');
  await settleItems(tx, ctx, { visitId: visit.id, settledBy: 'The visit was called off.' });
  const notes = channels
    .filter((channel) => !untold.booked.has(channel))
    .map((channel) => {
      const told = untold.moved.get(channel) ?? toldTimes(visit);
      return news(ctx, visit, 'called-off', channel, { ...told, reason });
    });
  return putNotes(tx, ctx, visit, notes);
}

type ReminderOccasion = 'please-confirm' | 'asked-again' | 'day-before';

/** Asked for a yes so many days before, asked again if silent, at this local time; told again the day before. */
const askDaysBefore = (kind: VisitKind) => (kind === 'install' ? 7 : 2);
const askAgainDaysBefore = (kind: VisitKind) => (kind === 'install' ? 4 : 1);
const askTime = '10:00';
const reminderTime = '16:00';
/** A reminder sooner after the booking than this would be the same thing twice. */
const leastHoursBetween: Record<ReminderOccasion, number> = {
  'please-confirm': 24,
  'asked-again': 40,
  'day-before': 3,
};

function reminders(ctx: Context, visit: ToldVisit): Note[] {
  const day = localDate(visit.windowStartsAt, visit.zone);
  const on = (daysBefore: number, time: string) =>
    fromLocal(addDays(day, -daysBefore), time, visit.zone);
  const dueTimes: Record<ReminderOccasion, Date> = {
    'please-confirm': on(askDaysBefore(visit.kind), askTime),
    'asked-again': on(askAgainDaysBefore(visit.kind), askTime),
    'day-before': on(1, reminderTime),
  };
  return (['please-confirm', 'asked-again', 'day-before'] as const).flatMap((occasion) => {
    const dueAt = dueTimes[occasion];
    const soonest = ctx.now.getTime() + leastHoursBetween[occasion] * 3_600_000;
    if (dueAt.getTime() < soonest) return [];
    return onEachChannel(occasion, { dueAt, notAfter: visit.windowEndsAt });
  });
}

function news(
  ctx: Context,
  visit: ToldVisit,
  occasion: Occasion,
  channel: Channel,
  cause: MessageCause = {},
): Note {
  // An hour ahead of nothing is no use; a visit called off is told until it would have ended.
  const notAfter = occasion === 'called-off' ? visit.endsAt : visit.windowEndsAt;
  const mayBeUndone = ctx.actor.kind === 'person';
  const dueAt = new Date(ctx.now.getTime() + (mayBeUndone ? undoMs : 0));
  return { occasion, channel, dueAt, notAfter, cause };
}

function toldTimes(visit: { windowStartsAt: Date; windowEndsAt: Date }): MessageCause {
  return {
    toldFrom: visit.windowStartsAt.toISOString(),
    toldUntil: visit.windowEndsAt.toISOString(),
  };
}

async function takeBack(tx: Transaction, ctx: Context, visitId: string, reason: string) {
  const withdrawn = await withdrawWaiting(tx, ctx, { visitId, reason });
  const of = (occasion: Occasion) => withdrawn.filter((row) => row.occasion === occasion);
  return {
    booked: new Set(of('booked').map(({ channel }) => channel)),
    moved: new Map(of('moved').map(({ channel, cause }) => [channel, cause])),
    calledOff: new Map(of('called-off').map(({ channel, cause }) => [channel, cause])),
  };
}
