import { and, eq } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { visits } from '@/db/schema';
import type { PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { ofOwnCrews } from './own-crews';

/** A visit of one's own crew, or any in the office; whatever else is asked for is not there. */
export async function ownVisit(db: Database, ctx: PersonContext, visitId: string) {
  const [visit] = await db
    .select({
      id: visits.id,
      jobId: visits.jobId,
      crewId: visits.crewId,
      kind: visits.kind,
      status: visits.status,
      startsAt: visits.startsAt,
      endsAt: visits.endsAt,
    })
    .from(visits)
    .where(and(eq(visits.shopId, ctx.shop.id), eq(visits.id, visitId), ofOwnCrews(ctx)));
  if (!visit) throw notFound('visit');
  return visit;
}
export type OwnVisit = Awaited<ReturnType<typeof ownVisit>>;
