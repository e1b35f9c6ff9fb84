import { and, asc, eq, inArray, or } from 'drizzle-orm';
import type { Database } from '@/db/database';
import {
  audit,
  consents,
  customers,
  files,
  jobs,
  messages,
  readings,
  releases,
  rooms,
  signOffs,
  sites,
  snags,
  visitChecks,
  visits,
} from '@/db/schema';

/** All that a shop holds of one customer, table by table, as it stands; null when it is not this shop's. */
export async function readCustomerRecord(db: Database, shopId: string, customerId: string) {
  const [customer] = await db
    .select()
    .from(customers)
    .where(and(eq(customers.shopId, shopId), eq(customers.id, customerId)));
  if (!customer) return null;
  const ofJobs = await db
    .select()
    .from(jobs)
    .where(and(eq(jobs.shopId, shopId), eq(jobs.customerId, customerId)))
    .orderBy(asc(jobs.number));
  const jobIds = ofJobs.map(({ id }) => id);
  const ofSites = await db
    .select()
    .from(sites)
    .where(and(eq(sites.shopId, shopId), eq(sites.customerId, customerId)));
  const ofRooms = await db
    .select()
    .from(rooms)
    .where(and(eq(rooms.shopId, shopId), inArray(rooms.jobId, jobIds)));
  const roomIds = ofRooms.map(({ id }) => id);
  const ofVisits = await db
    .select()
    .from(visits)
    .where(and(eq(visits.shopId, shopId), inArray(visits.jobId, jobIds)))
    .orderBy(asc(visits.startsAt));
  return {
    customer,
    consents: await db
      .select()
      .from(consents)
      .where(and(eq(consents.shopId, shopId), eq(consents.customerId, customerId)))
      .orderBy(asc(consents.sequence)),
    // A way in stays with the door: no code leaves in a file.
    sites: ofSites.map(({ accessCodeSealed: _sealed, ...site }) => site),
    jobs: ofJobs,
    visits: ofVisits,
    rooms: ofRooms,
    readings: await db
      .select()
      .from(readings)
      .where(and(eq(readings.shopId, shopId), inArray(readings.roomId, roomIds))),
    releases: await db
      .select({
        id: releases.id,
        roomId: releases.roomId,
        revision: releases.revision,
        releasedAt: releases.releasedAt,
        runs: releases.runs,
        changes: releases.changes,
      })
      .from(releases)
      .where(and(eq(releases.shopId, shopId), inArray(releases.roomId, roomIds))),
    messages: await db
      .select()
      .from(messages)
      .where(
        and(
          eq(messages.shopId, shopId),
          or(eq(messages.customerId, customerId), inArray(messages.jobId, jobIds)),
        ),
      )
      .orderBy(asc(messages.createdAt)),
    checks: await db
      .select()
      .from(visitChecks)
      .where(
        and(
          eq(visitChecks.shopId, shopId),
          inArray(
            visitChecks.visitId,
            ofVisits.map(({ id }) => id),
          ),
        ),
      ),
    snags: await db
      .select()
      .from(snags)
      .where(and(eq(snags.shopId, shopId), inArray(snags.jobId, jobIds))),
    signOffs: await db
      .select()
      .from(signOffs)
      .where(and(eq(signOffs.shopId, shopId), inArray(signOffs.jobId, jobIds))),
    files: await db
      .select()
      .from(files)
      .where(and(eq(files.shopId, shopId), inArray(files.jobId, jobIds))),
    story: await db
      .select()
      .from(audit)
      .where(and(eq(audit.shopId, shopId), inArray(audit.jobId, jobIds)))
      .orderBy(asc(audit.sequence)),
  };
}
export type CustomerRecord = NonNullable<Awaited<ReturnType<typeof readCustomerRecord>>>;
