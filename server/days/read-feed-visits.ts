import { and, asc, eq, gt, inArray, ne, or } from 'drizzle-orm';
import {
  crewPeople,
  crews,
  customers,
  jobs,
  sites,
  visitPiecePeople,
  visitPieces,
  visits,
} from '@/db/schema';
import type { Context } from '@/server/base/context';

export type FeedOf = { crewId: string | null; personId: string | null };

/** What calendars keep of the past. */
const daysBack = 30;

/** The visits of a crew or of a person with their days; those called off with their old times. */
export async function readFeedVisits(ctx: Context, of: FeedOf) {
  const shopId = ctx.shop.id;
  const since = new Date(ctx.now.getTime() - daysBack * 86_400_000);
  const rows = await ctx.db
    .select({
      id: visits.id,
      kind: visits.kind,
      status: visits.status,
      version: visits.version,
      changedAt: visits.changedAt,
      startsAt: visits.startsAt,
      endsAt: visits.endsAt,
      crewName: crews.name,
      jobNumber: jobs.number,
      jobTitle: jobs.title,
      customerName: customers.name,
      phone: customers.phone,
      street: sites.street,
      town: sites.town,
      wayIn: sites.wayIn,
      latitude: sites.latitude,
      longitude: sites.longitude,
    })
    .from(visits)
    .innerJoin(crews, eq(crews.id, visits.crewId))
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(
      and(
        eq(visits.shopId, shopId),
        gt(visits.endsAt, since),
        ne(visits.status, 'held'),
        of.crewId ? eq(visits.crewId, of.crewId) : personsVisits(ctx, of.personId ?? ''),
      ),
    )
    .orderBy(asc(visits.startsAt), asc(visits.id));
  const pieces = await readPieces(
    ctx,
    of,
    rows.map(({ id }) => id),
  );
  return rows.map((row) => ({
    ...row,
    pieces: row.status === 'called-off' ? [row] : (pieces.get(row.id) ?? []),
  }));
}

/** Those on which they go; of those called off nobody is left, and their crew's are told. */
function personsVisits(ctx: Context, personId: string) {
  const going = ctx.db
    .select({ id: visitPieces.visitId })
    .from(visitPieces)
    .innerJoin(visitPiecePeople, eq(visitPiecePeople.pieceId, visitPieces.id))
    .where(and(eq(visitPieces.shopId, ctx.shop.id), eq(visitPiecePeople.personId, personId)));
  const ownCrews = ctx.db
    .select({ id: crewPeople.crewId })
    .from(crewPeople)
    .where(and(eq(crewPeople.shopId, ctx.shop.id), eq(crewPeople.personId, personId)));
  return or(
    inArray(visits.id, going),
    and(eq(visits.status, 'called-off'), inArray(visits.crewId, ownCrews)),
  );
}

type Times = { startsAt: Date; endsAt: Date };

async function readPieces(ctx: Context, of: FeedOf, visitIds: string[]) {
  const byVisit = new Map<string, Times[]>();
  if (visitIds.length === 0) return byVisit;
  const ofThese = and(eq(visitPieces.shopId, ctx.shop.id), inArray(visitPieces.visitId, visitIds));
  const fields = {
    visitId: visitPieces.visitId,
    startsAt: visitPieces.startsAt,
    endsAt: visitPieces.endsAt,
  };
  const rows = of.personId
    ? await ctx.db
        .select(fields)
        .from(visitPieces)
        .innerJoin(visitPiecePeople, eq(visitPiecePeople.pieceId, visitPieces.id))
        .where(and(ofThese, eq(visitPiecePeople.personId, of.personId)))
        .orderBy(asc(visitPieces.startsAt))
    : await ctx.db
        .select(fields)
        .from(visitPieces)
        .where(ofThese)
        .orderBy(asc(visitPieces.startsAt));
  for (const { visitId, ...times } of rows) {
    byVisit.set(visitId, [...(byVisit.get(visitId) ?? []), times]);
  }
  return byVisit;
}
