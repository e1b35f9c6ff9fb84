import { and, asc, eq, gt, gte, lt, ne, or } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { customers, jobs, sites, visitPiecePeople, visitPieces, visits } from '@/db/schema';
import { goesOn } from '@/lib/schedule/work-calendar';
import { localDate } from '@/lib/time/local-moment';
import type { Zone } from '@/lib/time/zones';
import type { LatLon } from '@/lib/travel/place';
import type { Context } from '@/server/base/context';

/** Taken time with where it is and what the scheduler calls it. */
export type Busy = {
  pieceId: string;
  visitId: string;
  crewId: string;
  personIds: string[];
  startsAt: Date;
  endsAt: Date;
  place: LatLon | null;
  label: string;
};

/** All that is taken in a span of time; holds that are over are not. */
export async function readBusy(
  db: Database,
  ctx: Context,
  span: { from: Date; until: Date },
): Promise<Busy[]> {
  const inSpan = and(
    eq(visitPieces.shopId, ctx.shop.id),
    // No piece is longer than its day.
    gte(visitPieces.startsAt, new Date(span.from.getTime() - 86_400_000)),
    lt(visitPieces.startsAt, span.until),
    gt(visitPieces.endsAt, span.from),
  );
  const rows = await db
    .select({
      pieceId: visitPieces.id,
      visitId: visitPieces.visitId,
      crewId: visitPieces.crewId,
      startsAt: visitPieces.startsAt,
      endsAt: visitPieces.endsAt,
      customerName: customers.name,
      town: sites.town,
      lat: sites.latitude,
      lon: sites.longitude,
    })
    .from(visitPieces)
    .innerJoin(visits, eq(visits.id, visitPieces.visitId))
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .innerJoin(sites, eq(sites.id, jobs.siteId))
    .where(and(inSpan, or(ne(visits.status, 'held'), gt(visits.holdEndsAt, ctx.now))))
    .orderBy(asc(visitPieces.startsAt));
  const going = await db
    .select({ pieceId: visitPiecePeople.pieceId, personId: visitPiecePeople.personId })
    .from(visitPiecePeople)
    .innerJoin(visitPieces, eq(visitPieces.id, visitPiecePeople.pieceId))
    .where(inSpan);
  const personIds = new Map<string, string[]>();
  for (const { pieceId, personId } of going) {
    const known = personIds.get(pieceId);
    if (known) known.push(personId);
    else personIds.set(pieceId, [personId]);
  }
  return rows.map(({ customerName, town, lat, lon, ...piece }) => ({
    ...piece,
    personIds: personIds.get(piece.pieceId) ?? [],
    place: lat === null || lon === null ? null : { lat, lon },
    label: town === '' ? customerName : `${customerName} in ${town}`,
  }));
}

/**
 * What keeps a crew from going out: its own visits, and those of its people with other crews on days on which
 * they would go with it.
 */
export function busyOf(
  busy: readonly Busy[],
  crew: { id: string; people: readonly { id: string; weekdays: number[] | null }[] },
  zone: Zone,
): Busy[] {
  return busy.filter(({ crewId, personIds, startsAt }) => {
    if (crewId === crew.id) return true;
    const shared = crew.people.filter(({ id }) => personIds.includes(id));
    return shared.some((person) => goesOn(person, localDate(startsAt, zone)));
  });
}
