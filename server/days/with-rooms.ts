import { and, asc, eq, inArray } from 'drizzle-orm';
import { jobs, rooms } from '@/db/schema';
import type { TodayVisit, VisitView } from '@/lib/contracts/visits';
import type { PersonContext } from '@/server/base/context';

/** Visits with what is done there: the rooms of their jobs, and the office's notes. */
export async function withRooms(
  ctx: PersonContext,
  visits: VisitView[],
): Promise<Omit<TodayVisit, 'drive'>[]> {
  const jobIds = [...new Set(visits.map(({ jobId }) => jobId))];
  if (jobIds.length === 0) return [];
  const notes = await ctx.db
    .select({ id: jobs.id, notes: jobs.notes })
    .from(jobs)
    .where(and(eq(jobs.shopId, ctx.shop.id), inArray(jobs.id, jobIds)));
  const ofJobs = await ctx.db
    .select({ jobId: rooms.jobId, id: rooms.id, name: rooms.name })
    .from(rooms)
    .where(and(eq(rooms.shopId, ctx.shop.id), inArray(rooms.jobId, jobIds)))
    .orderBy(asc(rooms.position), asc(rooms.createdAt), asc(rooms.id));
  return visits.map((visit) => ({
    ...visit,
    notes: notes.find(({ id }) => id === visit.jobId)?.notes ?? '',
    rooms: ofJobs
      .filter(({ jobId }) => jobId === visit.jobId)
      .map(({ id, name }) => ({ id, name })),
  }));
}
