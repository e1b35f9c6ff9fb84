/** Several visits of one customer that move at once, told in one message: what it says, and their calendar files. */
import type { MessageCause } from '@/lib/contracts/messages';
import type { Channel } from '@/lib/messages/consent';
import { visitInWords } from '@/lib/messages/visit-words';
import {
  formatDay,
  formatDayShort,
  formatWindow,
  formatWindowShort,
  type InstantRange,
} from '@/lib/time/format-instant';
import type { TextLocale } from '@/lib/time/text-locale';
import type { Context } from '@/server/base/context';
import type { DueMessage } from '@/server/messages/compose';
import type { Attachment } from '@/server/ports/email/email-port';
import { type CustomerVisit, readCustomerVisit } from './read-customer-visit';
import { visitCalendar } from './visit-calendar';
import { visitLinkAddress } from './visit-link';

/** `told`: the arrival that they were told last. */
export type Moved = { visit: CustomerVisit; told: InstantRange; link: string | null };

/** The others as they are now, each under the id of its message. */
export async function readOthers(
  ctx: Context,
  others: DueMessage['others'],
): Promise<(Moved & { id: string })[]> {
  const read = [];
  for (const { id, visitId, cause } of others) {
    const visit = await readCustomerVisit(ctx.db, ctx, visitId);
    const link = await visitLinkAddress(ctx.db, ctx, visitId);
    read.push({ id, visit, told: toldWindow(visit, cause), link });
  }
  return read;
}

/** The arrival that the customer was told last. */
export function toldWindow(visit: CustomerVisit, cause: MessageCause): InstantRange {
  return {
    from: cause.toldFrom ? new Date(cause.toldFrom) : visit.windowStartsAt,
    until: cause.toldUntil ? new Date(cause.toldUntil) : visit.windowEndsAt,
  };
}

/**
 * "Cabinet install: Mon, Dec 28, 8:00-10:00 AM" with its page on the next line, in the order of the days; an
 * e-mail has room for whole words and for the time before.
 */
export function movesWords(moves: Moved[], channel: Channel, locale: TextLocale): string {
  const inOrder = moves.toSorted((a, b) => +a.visit.windowStartsAt - +b.visit.windowStartsAt);
  const lines = inOrder.map(({ visit, told, link }) => {
    const words = channel === 'sms' ? shortWords(visit, locale) : longWords(visit, told, locale);
    return [words, link].filter(Boolean).join('\n');
  });
  return lines.join(channel === 'sms' ? '\n' : '\n\n');
}

function shortWords(visit: CustomerVisit, locale: TextLocale): string {
  const { windowStartsAt: from, windowEndsAt: until, zone } = visit;
  const window = formatWindowShort({ from, until }, zone, locale);
  return `${named(visit, locale)}: ${formatDayShort(from, zone, locale)}, ${window}`;
}

function longWords(visit: CustomerVisit, told: InstantRange, locale: TextLocale): string {
  const { windowStartsAt: from, windowEndsAt: until, zone } = visit;
  const wordsOf = (window: InstantRange) =>
    `${formatDay(window.from, zone, locale)}, ${formatWindow(window, zone, locale)}`;
  const [now, before] = [wordsOf({ from, until }), wordsOf(told)];
  return locale.language === 'es'
    ? `${named(visit, locale)}: ahora el ${now}, en lugar del ${before}.`
    : `${named(visit, locale)}: now ${now}, instead of ${before}.`;
}

function named(visit: CustomerVisit, locale: TextLocale): string {
  const words = visitInWords(visit.kind, locale);
  return words.charAt(0).toUpperCase() + words.slice(1);
}

/** One file a visit: all components of one calendar object must have the same UID (RFC 5546, 3.2.2). */
export function calendarFiles(ctx: Context, others: Moved[]): Attachment[] {
  return others.map(({ visit, link }, index) => ({
    filename: `visit-${index + 2}.ics`,
    contentType: 'text/calendar; charset=utf-8; method=REQUEST',
    content: new TextEncoder().encode(visitCalendar(ctx, visit, { method: 'REQUEST', link })),
  }));
}
