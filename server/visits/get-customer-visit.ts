import type { CustomerVisitView } from '@/lib/contracts/visits';
import { isOldHouse } from '@/lib/measure/rules/old-house';
import { saidBack } from '@/lib/messages/said-words';
import { formatAtLocalTime } from '@/lib/time/format-civil';
import { formatDay, formatTime, formatWindow } from '@/lib/time/format-instant';
import { toLocal } from '@/lib/time/local-moment';
import type { TextLocale } from '@/lib/time/text-locale';
import { aboutWords } from './message-values';
import { openLink } from './open-link';
import { type CustomerVisit, readCustomerVisit } from './read-customer-visit';
import { shopPhoneWords } from './shop-phone';
import { whoComes } from './visit-people';

/** The customer's page; null for a link that opens nothing, whatever the reason. Reading changes nothing. */
export async function getCustomerVisit(
  token: string,
  from: string,
): Promise<CustomerVisitView | null> {
  const ctx = await openLink(token, from);
  if (!ctx) return null;
  const visit = await readCustomerVisit(ctx.db, ctx, ctx.actor.visitId);
  const { shop } = ctx;
  const { language, zone, kind, status, street, town, customerSays } = visit;
  const locale: TextLocale = { language, region: shop.region };
  const { weekdayWords, dateWords } = dayParts(visit, locale);
  const isLate =
    visit.expectedAt !== null && ['booked', 'confirmed', 'on-the-way'].includes(status);
  return {
    language,
    region: shop.region,
    shopName: shop.name,
    shopPhone: shopPhoneWords(shop),
    kind,
    status,
    weekdayWords,
    dateWords,
    windowWords: formatWindow(
      { from: visit.windowStartsAt, until: visit.windowEndsAt },
      zone,
      locale,
    ),
    untilWords: untilWords(visit, locale),
    whoComes: await whoComes(ctx.db, ctx, visit.id),
    street,
    town,
    customerSays: saidBack(customerSays, language),
    saysNotReady: customerSays !== '' && customerSays === visit.notReady,
    arrivalWords: isLate && visit.expectedAt ? aboutWords(visit.expectedAt, zone, locale) : '',
    isOldHouse: isOldHouse(visit.yearBuilt, shop.region),
  };
}

/** "Thursday" and "December 10": the page sets them on two lines. */
function dayParts({ windowStartsAt, zone }: CustomerVisit, locale: TextLocale) {
  const words = formatDay(windowStartsAt, zone, locale);
  const [weekdayWords = words, ...rest] = words.split(/,? /);
  return { weekdayWords, dateWords: rest.join(' ') };
}

/** Until when they work: the time of the same day, or the last day; measures are short and say nothing. */
function untilWords(visit: CustomerVisit, locale: TextLocale): string {
  const { startsAt, endsAt, zone, kind } = visit;
  if (kind === 'site-measure' || kind === 'check-measure') return '';
  const time = formatTime(endsAt, zone, locale);
  const isOneDay = toLocal(startsAt, zone).date === toLocal(endsAt, zone).date;
  const day = formatDay(endsAt, zone, locale);
  if (locale.language === 'es') {
    // "las 3:30 p.m.", but "la 1:00 p.m."
    const hour = formatAtLocalTime(toLocal(endsAt, zone).time, locale).replace(/^a /, '');
    return isOneDay ? `hasta cerca de ${hour}` : `hasta el ${day}, cerca de ${hour}`;
  }
  return isOneDay ? `until about ${time}` : `until ${day}, about ${time}`;
}
