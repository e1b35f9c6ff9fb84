/** What stands for each field of a message about a visit, from the visit as it is now. */
import { and, eq, inArray } from 'drizzle-orm';
import { jobs, sites, visits } from '@/db/schema';
import type { MessageCause } from '@/lib/contracts/messages';
import type { FieldValues } from '@/lib/messages/template';
import { visitInWords } from '@/lib/messages/visit-words';
import { formatDay, formatDayShort, formatTime, formatWindow } from '@/lib/time/format-instant';
import type { TextLocale } from '@/lib/time/text-locale';
import type { Context } from '@/server/base/context';
import { toldWindow } from './moves-together';
import type { CustomerVisit } from './read-customer-visit';
import { shopPhoneWords } from './shop-phone';

export function valuesOf(
  ctx: Context,
  visit: CustomerVisit,
  known: {
    cause: MessageCause;
    locale: TextLocale;
    names: string[];
    link: string | null;
    choices: string;
    moves: string;
  },
): FieldValues {
  const { cause, locale, names, link, choices, moves } = known;
  const { zone } = visit;
  const now = { from: visit.windowStartsAt, until: visit.windowEndsAt };
  const told = toldWindow(visit, cause);
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
    missing: cause.reason ?? visit.notReady,
    choices,
    moves,
    ...lateValues(visit, locale),
    ...(link ? { link } : {}),
  };
}

function lateValues({ expectedAt, windowEndsAt, zone }: CustomerVisit, locale: TextLocale) {
  if (!expectedAt) return {};
  const late = Math.round((expectedAt.getTime() - windowEndsAt.getTime()) / 60_000);
  return { minutesLate: String(late), arrival: aboutWords(expectedAt, zone, locale) };
}

/** "about 11:30 AM", "cerca de las 11:30 a.m." */
export function aboutWords(instant: Date, zone: string, locale: TextLocale): string {
  const time = formatTime(instant, zone, locale);
  if (locale.language === 'en') return `about ${time}`;
  return `cerca de ${/^0?1:/.test(time) ? 'la' : 'las'} ${time}`;
}

/** "1 for the site measure on Thu, May 22, or 2 for …": the numbers by which the customer answers. */
export async function choiceWords(
  ctx: Context,
  visitIds: string[],
  locale: TextLocale,
): Promise<string> {
  if (visitIds.length === 0) return '';
  const rows = await ctx.db
    .select({ id: visits.id, kind: visits.kind, at: visits.windowStartsAt, zone: sites.zone })
    .from(visits)
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(and(eq(visits.shopId, ctx.shop.id), inArray(visits.id, visitIds)));
  const isSpanish = locale.language === 'es';
  const choices = visitIds.flatMap((visitId, index) => {
    const row = rows.find(({ id }) => id === visitId);
    if (!row) return [];
    const what = visitInWords(row.kind, locale);
    const day = formatDayShort(row.at, row.zone, locale);
    return [
      isSpanish
        ? `${index + 1} para la ${what} del ${day}`
        : `${index + 1} for the ${what} on ${day}`,
    ];
  });
  return choices.join(isSpanish ? ', o ' : ', or ');
}

/** "Ines, Bram and Odell" */
function listWords(names: string[], { language }: TextLocale): string {
  const last = names.at(-1) ?? '';
  if (names.length < 2) return last;
  return `${names.slice(0, -1).join(', ')} ${language === 'es' ? 'y' : 'and'} ${last}`;
}
