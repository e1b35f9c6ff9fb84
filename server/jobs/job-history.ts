import { and, eq, isNotNull } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { jobs, releaseReceipts, releases, rooms, visits } from '@/db/schema';
import type { StageEvent } from '@/lib/schedule';
import { localDate } from '@/lib/time/local-moment';
import type { Context } from '@/server/base/context';

type Happened = { at: Date; event: StageEvent };

/** What has happened to a job, oldest first, as the records show it; holds are left out. */
export async function jobHistory(
  tx: Transaction,
  ctx: Context,
  jobId: string,
): Promise<StageEvent[]> {
  const shopId = ctx.shop.id;
  const visited = await tx
    .select({ kind: visits.kind, createdAt: visits.createdAt, arrivedAt: visits.arrivedAt })
    .from(visits)
    .where(and(eq(visits.shopId, shopId), eq(visits.jobId, jobId)));
  const measured = await tx
    .select({ at: rooms.submittedAt })
    .from(rooms)
    .where(and(eq(rooms.shopId, shopId), eq(rooms.jobId, jobId), isNotNull(rooms.submittedAt)));
  const released = await tx
    .select({ releasedAt: releases.releasedAt, takenUpAt: releaseReceipts.takenUpAt })
    .from(releases)
    .innerJoin(rooms, eq(rooms.id, releases.roomId))
    .leftJoin(releaseReceipts, eq(releaseReceipts.releaseId, releases.id))
    .where(and(eq(releases.shopId, shopId), eq(rooms.jobId, jobId)));
  const [said] = await tx
    .select({ readyOn: jobs.readyOn, readySaidAt: jobs.readySaidAt })
    .from(jobs)
    .where(and(eq(jobs.shopId, shopId), eq(jobs.id, jobId)));

  const isReady = said?.readyOn && said.readyOn <= localDate(ctx.now, ctx.shop.zone);
  const happened: Happened[] = [
    ...visited.flatMap(({ kind, createdAt, arrivedAt }) => [
      ...(kind === 'site-measure' ? told('measure-booked', createdAt) : []),
      ...(kind === 'install' ? told('arrived-for-install', arrivedAt) : []),
    ]),
    ...measured.flatMap(({ at }) => told('readings-handed-in', at)),
    ...released.flatMap(({ releasedAt, takenUpAt }) => [
      ...told('revision-released', releasedAt),
      ...told('sheet-taken-up', takenUpAt),
    ]),
    ...(isReady ? told('bench-says-ready', said.readySaidAt) : []),
  ];
  return happened.sort((a, b) => a.at.getTime() - b.at.getTime()).map(({ event }) => event);
}

function told(event: StageEvent, at: Date | null): Happened[] {
  return at ? [{ at, event }] : [];
}
