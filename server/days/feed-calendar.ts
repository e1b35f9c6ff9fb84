/** A crew's or a person's visits as a calendar that others' programs subscribe to (RFC 5545). */
import ical, { ICalEventStatus } from 'ical-generator';
import { phoneWords } from '@/lib/messages/phone-number';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import type { Context } from '@/server/base/context';
import { env } from '@/server/base/env';
import type { readFeedVisits } from './read-feed-visits';

type FeedVisit = Awaited<ReturnType<typeof readFeedVisits>>[number];

const askAgainSeconds = 900;

/**
 * One entry for each day of a visit, in UTC with no zone: several readers get a zone's clock changes wrong.
 * The same visits give the same text, so that what has not changed is not sent again.
 */
export function feedCalendar(ctx: Context, name: string, visits: readonly FeedVisit[]): string {
  const calendar = ical({
    prodId: { company: 'setwell', product: 'diary' },
    name: `${ctx.shop.name}: ${name}`,
    ttl: askAgainSeconds,
  });
  for (const visit of visits) {
    for (const [index, piece] of visit.pieces.entries()) {
      calendar.createEvent({
        id: uidOf(visit.id, index),
        sequence: visit.version,
        // Without a METHOD it is the moment of the last change (RFC 5545, 3.8.7.2).
        stamp: visit.changedAt,
        start: piece.startsAt,
        end: piece.endsAt,
        summary: summaryOf(visit, index),
        location: [visit.street, visit.town].filter(Boolean).join(', '),
        description: describe(ctx, visit),
        status: statusOf(visit),
      });
    }
  }
  return calendar.toString();
}

/** Stable over moves; the days of a long visit are counted. */
function uidOf(visitId: string, index: number): string {
  const host = new URL(env().publicUrl).hostname;
  return `diary-${visitId}${index > 0 ? `-day-${index + 1}` : ''}@${host}`;
}

function summaryOf({ kind, customerName, town, pieces }: FeedVisit, index: number): string {
  const days = pieces.length > 1 ? ` (day ${index + 1} of ${pieces.length})` : '';
  return `${visitKindWords[kind]}: ${[customerName, town].filter(Boolean).join(', ')}${days}`;
}

/** No access code, ever: a calendar is kept in places that nobody here knows. */
function describe(ctx: Context, visit: FeedVisit): string {
  const { jobNumber, jobTitle, crewName, phone, wayIn } = visit;
  const lines = [
    `Job ${jobNumber}, ${jobTitle}`,
    crewName,
    phoneWords(phone, ctx.shop.region),
    wayIn,
  ];
  return lines.filter(Boolean).join('\n');
}

function statusOf({ status }: FeedVisit): ICalEventStatus {
  if (status === 'called-off') return ICalEventStatus.CANCELLED;
  return status === 'booked' ? ICalEventStatus.TENTATIVE : ICalEventStatus.CONFIRMED;
}
