import type { MessageCause } from '@/lib/contracts/messages';
import { type Occasion, occasions } from '@/lib/messages/occasions';
import { renderEmail, renderSms } from '@/lib/messages/render-message';
import type { FieldValues } from '@/lib/messages/template';
import { visitInWords } from '@/lib/messages/visit-words';
import { formatDay, formatWindow } from '@/lib/time/format-instant';
import type { TextLocale } from '@/lib/time/text-locale';
import type { Context, SystemActor } from '@/server/base/context';
import type { Compose, Composed } from '@/server/messages/compose';
import { type CustomerVisit, readCustomerVisit } from './read-customer-visit';
import { shopPhoneWords } from './shop-phone';
import { type CalendarMethod, visitCalendar } from './visit-calendar';
import { visitLinkAddress } from './visit-link';
import { whoComes } from './visit-people';

/** A message about a visit, in words, from the visit as it is now; or why it is not sent after all. */
export const composeVisitMessage: Compose = async (ctx, message, recipient) => {
  const occasion = occasions.find((known) => known === message.occasion);
  if (!occasion) return refused(`Nothing is known of the occasion "${message.occasion}".`);
  const visit = await readCustomerVisit(ctx.db, ctx, message.visitId);
  const pointless = whyPointless(occasion, visit);
  if (pointless) return { is: 'withdrawn', reason: pointless };

  const link = await visitLinkAddress(ctx.db, ctx, visit.id);
  const locale: TextLocale = { language: recipient.language, region: ctx.shop.region };
  const names = await whoComes(ctx.db, ctx, visit.id);
  const values = valuesOf(ctx, visit, { cause: message.cause, locale, names, link });
  const input = { occasion, language: recipient.language, values };
  if (message.channel === 'sms') {
    const { value, problems } = renderSms(input);
    return value === null ? refused(problems[0]?.message) : { is: 'sms', body: value };
  }
  const { value, problems } = renderEmail(input);
  if (value === null) return refused(problems[0]?.message);
  const method = calendarMethod(occasion);
  return {
    is: 'email',
    email: {
      ...value,
      ...(ctx.shop.email ? { replyTo: ctx.shop.email } : {}),
      ...(method ? { ics: { method, content: visitCalendar(ctx, visit, { method, link }) } } : {}),
    },
  };
};

function refused(why: string | undefined): Composed {
  return { is: 'refused', reason: why ?? 'It could not be written.' };
}

/** What the visit has become since makes some messages wrong or needless. */
function whyPointless(occasion: Occasion, { status }: CustomerVisit): string | null {
  if (occasion === 'called-off') return status === 'called-off' ? null : 'It stands again.';
  if (status === 'called-off') return 'The visit was called off.';
  if (occasion === 'done') return null;
  if (status === 'done' || status === 'missed') return 'The visit is over.';
  if (occasion === 'please-confirm' && status !== 'booked') return 'Confirmed already.';
  if (occasion !== 'on-my-way' && occasion !== 'running-late') {
    if (status === 'on-the-way' || status === 'on-site') return 'The crew is on the way already.';
  }
  return null;
}

/** Reminders change nothing in a calendar. */
function calendarMethod(occasion: Occasion): CalendarMethod | null {
  if (occasion === 'called-off') return 'CANCEL';
  return occasion === 'booked' || occasion === 'moved' ? 'REQUEST' : null;
}

function valuesOf(
  ctx: Context<SystemActor>,
  visit: CustomerVisit,
  known: { cause: MessageCause; locale: TextLocale; names: string[]; link: string | null },
): FieldValues {
  const { cause, locale, names, link } = known;
  const { zone } = visit;
  const now = { from: visit.windowStartsAt, until: visit.windowEndsAt };
  const told = {
    from: cause.toldFrom ? new Date(cause.toldFrom) : now.from,
    until: cause.toldUntil ? new Date(cause.toldUntil) : now.until,
  };
  // A visit that is called off is named by the day that the customer was told last.
  const day = visit.status === 'called-off' ? told.from : now.from;
  return {
    shop: ctx.shop.name,
    shopPhone: shopPhoneWords(ctx.shop),
    customer: visit.customerName,
    visit: visitInWords(visit.kind, locale),
    day: formatDay(day, zone, locale),
    window: formatWindow(now, zone, locale),
    address: [visit.street, visit.town].filter(Boolean).join(', '),
    crew: listWords(names, locale) || ctx.shop.name,
    oldDay: formatDay(told.from, zone, locale),
    oldWindow: formatWindow(told, zone, locale),
    reason: cause.reason ?? '',
    ...(link ? { link } : {}),
  };
}

/** "Ines, Bram and Odell" */
function listWords(names: string[], { language }: TextLocale): string {
  const last = names.at(-1) ?? '';
  if (names.length < 2) return last;
  return `${names.slice(0, -1).join(', ')} ${language === 'es' ? 'y' : 'and'} ${last}`;
}
