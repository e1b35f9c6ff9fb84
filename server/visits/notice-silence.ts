import { and, eq, exists, gt, inArray, isNotNull, lt, lte, notExists, sql } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { customers, jobs, messages, schedulerItems, visits } from '@/db/schema';
import type { Occasion } from '@/lib/messages/occasions';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { putItem } from '@/server/messages/scheduler-items';

/** Asked for the last time so long ago, who has not answered is rung. */
const patienceMs = 4 * 3_600_000;
const mostAtOnce = 20;

/** Visits of all shops whose customer was asked twice, or once for the last time, and stays silent. */
export async function noticeSilence(db: Database, now: Date): Promise<void> {
  const asking = (occasion: Occasion) =>
    db
      .select({ id: messages.id })
      .from(messages)
      .where(
        and(
          eq(messages.shopId, visits.shopId),
          eq(messages.visitId, visits.id),
          eq(messages.occasion, occasion),
          inArray(messages.state, ['sent', 'delivered', 'refused']),
          isNotNull(messages.firstTriedAt),
          lt(messages.firstTriedAt, new Date(now.getTime() - patienceMs)),
        ),
      );
  const isOnList = db
    .select({ id: schedulerItems.id })
    .from(schedulerItems)
    .where(
      and(eq(schedulerItems.shopId, visits.shopId), eq(schedulerItems.key, silenceKeyOfVisit())),
    );
  const silent = await db
    .select({
      shopId: visits.shopId,
      visitId: visits.id,
      version: visits.version,
      kind: visits.kind,
      jobId: visits.jobId,
      customerId: customers.id,
    })
    .from(visits)
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .where(
      and(
        eq(visits.status, 'booked'),
        eq(visits.customerSays, ''),
        gt(visits.startsAt, now),
        lte(visits.startsAt, new Date(now.getTime() + 7 * 86_400_000)),
        exists(asking('asked-again')),
        notExists(isOnList),
      ),
    )
    .limit(mostAtOnce);
  for (const { kind, version, ...of } of silent) {
    await db.transaction((tx) =>
      putItem(tx, {
        ...of,
        kind: 'no-answer',
        key: `no-answer:${of.visitId}:${version}`,
        words: `${visitKindWords[kind]}: asked twice and not answered. Ring them.`,
        at: now,
      }),
    );
  }
}

function silenceKeyOfVisit() {
  return sql<string>`'no-answer:' || ${visits.id} || ':' || ${visits.version}`;
}
