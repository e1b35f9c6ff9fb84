import { and, asc, eq, gte, inArray } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { visits } from '@/db/schema';
import { formatDayShort, formatTime } from '@/lib/time/format-instant';
import type { Context } from '@/server/base/context';

const stillToCome = ['booked', 'confirmed', 'on-the-way', 'on-site'] as const;

/** The next visit of each job in words, in the shop's zone; one query for all of them. */
export async function nextVisitWords(
  ctx: Context,
  db: Database,
  jobIds: string[],
): Promise<Map<string, string>> {
  if (jobIds.length === 0) return new Map();
  const found = await db
    .selectDistinctOn([visits.jobId], { jobId: visits.jobId, startsAt: visits.startsAt })
    .from(visits)
    .where(
      and(
        eq(visits.shopId, ctx.shop.id),
        inArray(visits.jobId, jobIds),
        inArray(visits.status, [...stillToCome]),
        gte(visits.endsAt, ctx.now),
      ),
    )
    .orderBy(asc(visits.jobId), asc(visits.startsAt), asc(visits.id));
  const { zone, region } = ctx.shop;
  const locale = { language: 'en', region } as const;
  return new Map(
    found.map(({ jobId, startsAt }) => [
      jobId,
      `${formatDayShort(startsAt, zone, locale)}, ${formatTime(startsAt, zone, locale)}`,
    ]),
  );
}
