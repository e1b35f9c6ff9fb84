import { and, asc, eq, isNull, lte } from 'drizzle-orm';
import type { Database, Transaction } from '@/db/database';
import { jobs, sites } from '@/db/schema';
import type { FoundPlace } from '@/lib/contracts/travel';
import { writeAudit } from '@/server/base/audit';
import type { Context } from '@/server/base/context';
import { shopContext } from '@/server/base/shop-context';
import type { GeocodePort } from '@/server/ports/geocode/geocode-port';
import { askPlaces, keptPlaces } from '@/server/shops/look-up-address';

/** So few at a time that a stop of the program waits for none of them long; the service's pace is the port's. */
const mostAtOnce = 5;
/** Longer than any question: a site that was taken and not settled is taken again. */
const leaseMs = 60_000;
/** When a service that did not answer is asked again. */
const againMs = { unreachable: 120_000, 'no-answer': 120_000, busy: 10_000, refused: 3_600_000 };

/** Looks up the pins that an imported list waits for. What is not found stays without one, and on the list. */
export async function placeDueSites(db: Database, geocode: GeocodePort, now: Date): Promise<void> {
  for (let count = 0; count < mostAtOnce; count += 1) {
    const site = await takeDueSite(db, now);
    if (!site) return;
    const ctx = await shopContext(db, {
      shopId: site.shopId,
      actor: { kind: 'system', name: 'Setwell' },
      now,
    });
    await placeByAddress(ctx, geocode, site);
  }
}

const fields = {
  shopId: sites.shopId,
  id: sites.id,
  street: sites.street,
  town: sites.town,
  postcode: sites.postcode,
};

async function takeDueSite(db: Database, now: Date) {
  return db.transaction(async (tx) => {
    const [site] = await tx
      .select(fields)
      .from(sites)
      .where(lte(sites.placeDueAt, now))
      .orderBy(asc(sites.placeDueAt), asc(sites.id))
      .limit(1)
      .for('update', { skipLocked: true });
    if (!site) return null;
    await putOff(tx, site, new Date(now.getTime() + leaseMs));
    return site;
  });
}

type DueSite = NonNullable<Awaited<ReturnType<typeof takeDueSite>>>;

async function placeByAddress(ctx: Context, geocode: GeocodePort, site: DueSite): Promise<void> {
  const kept = await keptPlaces(ctx.db, ctx, site);
  const answer = kept ? ({ ok: true, places: kept } as const) : await askPlaces(ctx, geocode, site);
  if (!answer.ok) {
    return putOff(ctx.db, site, new Date(ctx.now.getTime() + againMs[answer.reason]));
  }
  // No nearer than the town would make drives that look known.
  const place = answer.places.find(({ nearness }) => nearness !== 'area');
  await ctx.db.transaction((tx) => settle(tx, ctx, site, place));
}

async function settle(
  tx: Transaction,
  ctx: Context,
  site: DueSite,
  place: FoundPlace | undefined,
): Promise<void> {
  const theSite = and(eq(sites.shopId, ctx.shop.id), eq(sites.id, site.id));
  // A pin that somebody put by hand meanwhile stays.
  const settled = await tx
    .update(sites)
    .set({
      placeDueAt: null,
      ...(place ? { latitude: place.lat, longitude: place.lon } : {}),
    })
    .where(and(theSite, isNull(sites.latitude)))
    .returning({ id: sites.id });
  if (settled.length === 0) return putOff(tx, site, null);
  const ofSite = await tx
    .select({ jobId: jobs.id })
    .from(jobs)
    .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.siteId, site.id)));
  for (const { jobId } of ofSite) {
    await writeAudit(tx, ctx, {
      verb: 'place-due-sites',
      subjectKind: 'job',
      subjectId: jobId,
      jobId,
      summary: place
        ? `Site put on the map by its address: ${place.label}${place.nearness === 'street' ? ', somewhere along the street' : ''}`
        : 'Site not found by its address: put the pin by hand',
    });
  }
}

async function putOff(
  db: Database | Transaction,
  { shopId, id }: Pick<DueSite, 'shopId' | 'id'>,
  placeDueAt: Date | null,
): Promise<void> {
  await db
    .update(sites)
    .set({ placeDueAt })
    .where(and(eq(sites.shopId, shopId), eq(sites.id, id)));
}
