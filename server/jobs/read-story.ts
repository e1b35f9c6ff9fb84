import { and, desc, eq } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { audit } from '@/db/schema';
import type { JobView } from '@/lib/contracts/jobs';
import { formatDayShort, formatTime } from '@/lib/time/format-instant';
import type { Context } from '@/server/base/context';

const mostLines = 200;

/** What happened to a job, newest first, from the audit. */
export async function readStory(
  ctx: Context,
  db: Database,
  jobId: string,
): Promise<JobView['story']> {
  const lines = await db
    .select({ id: audit.id, at: audit.at, who: audit.actorName, summary: audit.summary })
    .from(audit)
    .where(and(eq(audit.shopId, ctx.shop.id), eq(audit.jobId, jobId)))
    .orderBy(desc(audit.sequence))
    .limit(mostLines);
  const { zone, region } = ctx.shop;
  const locale = { language: 'en', region } as const;
  return lines.map(({ at, ...line }) => ({
    ...line,
    at: at.toISOString(),
    atWords: `${formatDayShort(at, zone, locale)}, ${formatTime(at, zone, locale)}`,
  }));
}
