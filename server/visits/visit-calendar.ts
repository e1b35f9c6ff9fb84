/** A visit as a calendar object (RFC 5545, 5546): a move updates the customer's entry, calling off removes it. */
import ical, {
  ICalAttendeeRole,
  ICalAttendeeStatus,
  ICalCalendarMethod,
  ICalEventStatus,
} from 'ical-generator';
import { visitInWords } from '@/lib/messages/visit-words';
import type { Context } from '@/server/base/context';
import { env } from '@/server/base/env';
import type { CustomerVisit } from './read-customer-visit';
import { shopPhoneWords } from './shop-phone';

export type CalendarMethod = 'REQUEST' | 'CANCEL' | 'PUBLISH';

/** Times are in UTC with no zone: several readers get a zone's clock changes wrong. */
export function visitCalendar(
  ctx: Context,
  visit: CustomerVisit,
  options: { method: CalendarMethod; link: string | null },
): string {
  const { shop, now } = ctx;
  const { method, link } = options;
  const calendar = ical({
    prodId: { company: 'setwell', product: 'visits' },
    method: ICalCalendarMethod[method],
  });
  const event = calendar.createEvent({
    // Stable over moves, so that they are the same entry.
    id: `visit-${visit.id}@${new URL(env().publicUrl).hostname}`,
    sequence: visit.version,
    stamp: now,
    start: visit.startsAt,
    end: visit.endsAt,
    summary: `${shop.name}: ${visitInWords(visit.kind, { language: visit.language, region: shop.region })}`,
    location: [visit.street, visit.town].filter(Boolean).join(', '),
    description: [shopPhoneWords(shop), link].filter(Boolean).join('\n'),
    status: method === 'CANCEL' ? ICalEventStatus.CANCELLED : ICalEventStatus.CONFIRMED,
  });
  const organizer = shop.email || addressIn(env().emailFrom);
  event.organizer({ name: nameOr(shop.name, organizer), email: organizer });
  // RFC 5546, 3.2: PUBLISH names no attendee, REQUEST and CANCEL name who is asked.
  if (method !== 'PUBLISH' && visit.email) {
    event.createAttendee({
      name: nameOr(visit.customerName, visit.email),
      email: visit.email,
      role: ICalAttendeeRole.REQ,
      status:
        visit.status === 'confirmed' ? ICalAttendeeStatus.ACCEPTED : ICalAttendeeStatus.NEEDSACTION,
    });
  }
  return calendar.toString();
}

/** A name on one line; who has none is called by the address. */
function nameOr(name: string, address: string): string {
  return name.replace(/[\p{Cc}"]+/gu, ' ').trim() || address;
}

/** "Setwell <no-reply@setwell.example>" → "no-reply@setwell.example" */
function addressIn(from: string): string {
  return /<([^>]+)>/.exec(from)?.[1] ?? from;
}
