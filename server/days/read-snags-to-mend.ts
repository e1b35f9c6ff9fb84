import { and, asc, eq, inArray, isNull, notInArray } from 'drizzle-orm';
import { jobs, sites, snags, visits } from '@/db/schema';
import type { CrewSnag } from '@/lib/contracts/snags';
import { may } from '@/lib/permissions';
import { localDate } from '@/lib/time/local-moment';
import type { PersonContext } from '@/server/base/context';
import { readSnags } from '@/server/snags/read-snags';
import { ofCrewsWithThem } from './own-crews';

/**
 * What the crews that one goes with have to mend on any of their jobs, the most pressing first. Whoever may
 * close no snag is shown none.
 */
export async function readSnagsToMend(ctx: PersonContext): Promise<CrewSnag[]> {
  if (!may(ctx.actor.role, 'snags:change')) return [];
  const isOwnVisit = and(
    eq(visits.shopId, ctx.shop.id),
    notInArray(visits.status, ['held', 'called-off']),
    ofCrewsWithThem(ctx),
  );
  const open = await readSnags(
    ctx.db,
    ctx,
    and(
      isNull(snags.closedAt),
      eq(snags.mender, 'crew'),
      inArray(snags.jobId, ctx.db.select({ jobId: visits.jobId }).from(visits).where(isOwnVisit)),
    ),
  );
  if (open.length === 0) return [];
  const stops = await ctx.db
    .select({
      visitId: visits.id,
      jobId: visits.jobId,
      startsAt: visits.startsAt,
      endsAt: visits.endsAt,
      street: sites.street,
      town: sites.town,
    })
    .from(visits)
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(and(isOwnVisit, inArray(visits.jobId, [...new Set(open.map(({ jobId }) => jobId))])))
    .orderBy(asc(visits.startsAt), asc(visits.id));
  const today = localDate(ctx.now, ctx.shop.zone);
  const isAhead = ({ endsAt }: { endsAt: Date }) => localDate(endsAt, ctx.shop.zone) >= today;
  return open.flatMap((snag) => {
    const ofJob = stops.filter(({ jobId }) => jobId === snag.jobId);
    const next = ofJob.find(isAhead);
    const stop = next ?? ofJob.at(-1);
    if (!stop) return [];
    const { visitId, street, town } = stop;
    // Work of several days that has begun goes on today.
    const begins = next ? localDate(next.startsAt, ctx.shop.zone) : null;
    const nextOn = begins !== null && begins < today ? today : begins;
    return [{ ...snag, visitId, street, town, nextOn }];
  });
}
