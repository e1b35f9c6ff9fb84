import { and, desc, eq } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { audit } from '@/db/schema';
import type { StaleVisit } from '@/lib/contracts/visit-changes';
import { formatDayShort, formatTime } from '@/lib/time/format-instant';
import { localDate } from '@/lib/time/local-moment';
import type { Context } from '@/server/base/context';

/** The newest line of a visit's story: who changed it last, when, and how. */
export async function readLastChange(db: Database, ctx: Context, visitId: string) {
  const [line] = await db
    .select({
      verb: audit.verb,
      by: audit.actorName,
      at: audit.at,
      summary: audit.summary,
      detail: audit.detail,
    })
    .from(audit)
    .where(
      and(
        eq(audit.shopId, ctx.shop.id),
        eq(audit.subjectKind, 'visit'),
        eq(audit.subjectId, visitId),
      ),
    )
    .orderBy(desc(audit.sequence))
    .limit(1);
  return line ?? null;
}

/** The same for whoever was too late: "today at 10:42 AM". */
export async function lastChangeWords(
  db: Database,
  ctx: Context,
  visitId: string,
): Promise<StaleVisit['lastChange']> {
  const line = await readLastChange(db, ctx, visitId);
  if (!line) return null;
  const { zone, region } = ctx.shop;
  const locale = { language: 'en', region } as const;
  const isToday = localDate(line.at, zone) === localDate(ctx.now, zone);
  const day = isToday ? 'today' : formatDayShort(line.at, zone, locale);
  return {
    by: line.by,
    atWords: `${day} at ${formatTime(line.at, zone, locale)}`,
    summary: line.summary,
  };
}
