import { and, asc, eq, gte, inArray, isNull, lt, lte, sql } from 'drizzle-orm';
import { jobs, messageSettings, messages, releases, rooms, snags, visits } from '@/db/schema';
import type { JobFact, MessageFact, ShortReleaseFact, SnagFact } from '@/lib/numbers/facts';
import type { VisitKind } from '@/lib/schedule/visit-kind';
import type { PersonContext } from '@/server/base/context';

type Period = { from: Date; until: Date };

/** Jobs whose first arrival for a kind of visit was in the period. */
export async function readFirstVisits(
  ctx: PersonContext,
  kind: VisitKind,
  { from, until }: Period,
): Promise<{ job: JobFact; at: Date }[]> {
  const rows = await ctx.db
    .select({
      jobId: jobs.id,
      jobNumber: jobs.number,
      enquiredAt: jobs.createdAt,
      arrivedAt: visits.arrivedAt,
    })
    .from(visits)
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .where(
      and(
        eq(visits.shopId, ctx.shop.id),
        eq(visits.kind, kind),
        inArray(visits.status, ['on-site', 'done']),
      ),
    )
    .orderBy(asc(visits.startsAt));
  const firsts = new Map<string, { job: JobFact; at: Date }>();
  for (const { arrivedAt, ...job } of rows) {
    if (arrivedAt && !firsts.has(job.jobId)) firsts.set(job.jobId, { job, at: arrivedAt });
  }
  return [...firsts.values()].filter(({ at }) => at >= from && at <= until);
}

export async function readMeasuredBefore(ctx: PersonContext, from: Date): Promise<Set<string>> {
  const rows = await ctx.db
    .selectDistinct({ jobId: visits.jobId })
    .from(visits)
    .where(
      and(
        eq(visits.shopId, ctx.shop.id),
        eq(visits.kind, 'site-measure'),
        eq(visits.status, 'done'),
        lt(visits.startsAt, from),
      ),
    );
  return new Set(rows.map(({ jobId }) => jobId));
}

/** Of these jobs, whenever found: a return visit is because of a snag from before. */
export async function readSnagFacts(ctx: PersonContext, until: Date): Promise<SnagFact[]> {
  return ctx.db
    .select({
      jobId: snags.jobId,
      jobNumber: jobs.number,
      kind: snags.kind,
      place: snags.place,
      foundAt: snags.foundAt,
    })
    .from(snags)
    .innerJoin(jobs, eq(jobs.id, snags.jobId))
    .where(and(eq(snags.shopId, ctx.shop.id), lte(snags.foundAt, until)))
    .orderBy(asc(snags.foundAt));
}

/** Releases in which the fit says of some run that its fillers come out too small. */
export async function readShortReleases(
  ctx: PersonContext,
  { from, until }: Period,
): Promise<ShortReleaseFact[]> {
  return ctx.db
    .select({
      jobId: rooms.jobId,
      jobNumber: jobs.number,
      roomName: rooms.name,
      revision: releases.revision,
      releasedAt: releases.releasedAt,
    })
    .from(releases)
    .innerJoin(rooms, eq(rooms.id, releases.roomId))
    .innerJoin(jobs, eq(jobs.id, rooms.jobId))
    .where(
      and(
        eq(releases.shopId, ctx.shop.id),
        gte(releases.releasedAt, from),
        lte(releases.releasedAt, until),
        sql`jsonb_path_exists(${releases.fit}, '$.runs[*].fill.verdict ? (@ == "short")')`,
      ),
    )
    .orderBy(asc(releases.releasedAt));
}

export async function readMessageFacts(
  ctx: PersonContext,
  { from, until }: Period,
): Promise<MessageFact[]> {
  const rows = await ctx.db
    .select({
      jobId: messages.jobId,
      jobNumber: jobs.number,
      sentAt: messages.sentAt,
      occasion: messages.occasion,
      segments: messages.segments,
    })
    .from(messages)
    .innerJoin(jobs, eq(jobs.id, messages.jobId))
    .where(
      and(
        eq(messages.shopId, ctx.shop.id),
        eq(messages.channel, 'sms'),
        inArray(messages.state, ['sent', 'delivered']),
        // What went in one text with another is that one text.
        isNull(messages.toldWith),
        gte(messages.sentAt, from),
        lte(messages.sentAt, until),
      ),
    )
    .orderBy(asc(messages.sentAt), asc(messages.id));
  return rows.flatMap(({ jobId, sentAt, ...row }) =>
    jobId && sentAt ? [{ ...row, jobId, sentAt }] : [],
  );
}

export async function readSegmentPrice(
  ctx: PersonContext,
): Promise<{ segmentPrice: number | null; currency: string }> {
  const [row] = await ctx.db
    .select({ segmentPrice: messageSettings.segmentPrice, currency: messageSettings.currency })
    .from(messageSettings)
    .where(eq(messageSettings.shopId, ctx.shop.id));
  return row ?? { segmentPrice: null, currency: 'USD' };
}
