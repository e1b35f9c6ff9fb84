import type { CustomerTimesView } from '@/lib/contracts/visits';
import { formatDay, formatTime, formatWindow } from '@/lib/time/format-instant';
import type { TextLocale } from '@/lib/time/text-locale';
import { offerTimes } from './offer-times';
import { openLink } from './open-link';
import { readCustomerVisit } from './read-customer-visit';
import { shopPhoneWords } from './shop-phone';

/** Other times for the customer's visit, and the one that is kept for them; null for a link that opens nothing. */
export async function getCustomerTimes(
  token: string,
  from: string,
): Promise<CustomerTimesView | null> {
  const ctx = await openLink(token, from);
  if (!ctx) return null;
  const visit = await readCustomerVisit(ctx.db, ctx, ctx.actor.visitId);
  const { language, zone, status } = visit;
  const locale: TextLocale = { language, region: ctx.shop.region };
  const { times, hold } = await offerTimes(ctx);
  return {
    language,
    shopName: ctx.shop.name,
    shopPhone: shopPhoneWords(ctx.shop),
    mayChange: status === 'booked' || status === 'confirmed',
    dayWords: formatDay(visit.windowStartsAt, zone, locale),
    windowWords: formatWindow(
      { from: visit.windowStartsAt, until: visit.windowEndsAt },
      zone,
      locale,
    ),
    times: times.map(({ crewId: _, ...time }) => time),
    hold: hold && { ...hold, untilWords: formatTime(new Date(hold.holdEndsAt), zone, locale) },
  };
}
