import { and, asc, eq, inArray } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { customers, jobs, releaseReceipts, releases, rooms, visits } from '@/db/schema';
import type { BenchSheet } from '@/lib/contracts/bench';
import { daysBetween } from '@/lib/time/civil';
import { formatLocalDayShort } from '@/lib/time/format-civil';
import { localDate } from '@/lib/time/local-moment';
import type { TextLocale } from '@/lib/time/text-locale';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { momentWords } from '@/server/walls/moment-words';
import { newestReleases } from '@/server/walls/newest-releases';

/** What the bench has to build: the newest sheet of each room, first install first. */
export async function listBench(ctx: PersonContext): Promise<BenchSheet[]> {
  mustBeAllowed(ctx, 'sheets:read');
  const roomRows = await ctx.db
    .select({ roomId: rooms.id })
    .from(rooms)
    .innerJoin(jobs, eq(jobs.id, rooms.jobId))
    .where(
      and(eq(rooms.shopId, ctx.shop.id), inArray(jobs.stage, ['released', 'in-build', 'ready'])),
    );
  const newest = await newestReleases(
    ctx.db,
    ctx,
    roomRows.map(({ roomId }) => roomId),
  );
  const rows = await readSheets(
    ctx,
    [...newest.values()].map(({ releaseId }) => releaseId),
  );
  const installs = await firstInstalls(
    ctx.db,
    ctx,
    rows.map(({ jobId }) => jobId),
  );
  const needOf = (row: (typeof rows)[number]) =>
    installs.get(row.jobId)?.getTime() ?? Number.POSITIVE_INFINITY;
  return rows
    .sort(
      (one, other) =>
        compare(needOf(one), needOf(other)) ||
        compare(one.releasedAt.getTime(), other.releasedAt.getTime()) ||
        one.jobNumber - other.jobNumber,
    )
    .map(({ releasedAt, takenUpAt, stage, ...row }) => {
      const install = installs.get(row.jobId);
      const needOn = install ? localDate(install, ctx.shop.zone) : null;
      return {
        ...row,
        releasedAtWords: momentWords(ctx, releasedAt),
        takenUpWords: takenUpAt ? momentWords(ctx, takenUpAt) : null,
        isSuperseded: newest.get(row.roomId)?.isSuperseded ?? false,
        needOn,
        needWords: dayWords(ctx, needOn),
        lateDays: needOn && row.readyOn ? Math.max(0, daysBetween(needOn, row.readyOn)) : 0,
        readyWords: dayWords(ctx, row.readyOn),
        isReady: stage === 'ready',
        today: localDate(ctx.now, ctx.shop.zone),
      };
    });
}

function readSheets(ctx: PersonContext, releaseIds: string[]) {
  return ctx.db
    .select({
      releaseId: releases.id,
      jobId: jobs.id,
      roomId: rooms.id,
      jobNumber: jobs.number,
      jobTitle: jobs.title,
      customerName: customers.name,
      roomName: rooms.name,
      revision: releases.revision,
      releasedAt: releases.releasedAt,
      takenUpAt: releaseReceipts.takenUpAt,
      readyOn: jobs.readyOn,
      readyWhere: jobs.readyWhere,
      readyWhy: jobs.readyWhy,
      finish: jobs.finish,
      stage: jobs.stage,
    })
    .from(releases)
    .innerJoin(rooms, eq(rooms.id, releases.roomId))
    .innerJoin(jobs, eq(jobs.id, rooms.jobId))
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .leftJoin(releaseReceipts, eq(releaseReceipts.releaseId, releases.id))
    .where(and(eq(releases.shopId, ctx.shop.id), inArray(releases.id, releaseIds)));
}

/** The first install of each job that still stands in the diary. */
async function firstInstalls(
  db: Database,
  ctx: PersonContext,
  jobIds: string[],
): Promise<Map<string, Date>> {
  const found = await db
    .selectDistinctOn([visits.jobId], { jobId: visits.jobId, startsAt: visits.startsAt })
    .from(visits)
    .where(
      and(
        eq(visits.shopId, ctx.shop.id),
        inArray(visits.jobId, jobIds),
        eq(visits.kind, 'install'),
        inArray(visits.status, ['held', 'booked', 'confirmed', 'on-the-way', 'on-site']),
      ),
    )
    .orderBy(asc(visits.jobId), asc(visits.startsAt));
  return new Map(found.map(({ jobId, startsAt }) => [jobId, startsAt]));
}

function dayWords(ctx: PersonContext, date: string | null): string | null {
  return date ? formatLocalDayShort(date, localeOf(ctx)) : null;
}

const localeOf = (ctx: PersonContext): TextLocale => ({ language: 'en', region: ctx.shop.region });

/** Infinity less Infinity is no number; two jobs without an install are as needed as each other. */
const compare = (one: number, other: number) => (one < other ? -1 : one > other ? 1 : 0);
