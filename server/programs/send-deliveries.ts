import { and, asc, eq, inArray, lte, sql } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { webhookDeliveries, webhooks } from '@/db/schema';
import { postSigned } from './post-signed';
import { webhookSecret, webhookSignature } from './webhook-secret';

const atOnce = 10;
/** Another worker leaves a delivery alone for this long; after that it is tried again. */
const leaseMs = 60_000;
/** Minutes until the next try; after the last, it is given up: two days in all. */
const waitMinutes = [1, 5, 30, 120, 480, 960, 1_440];

type Due = {
  id: string;
  shopId: string;
  webhookId: string;
  url: string;
  event: string;
  subject: Record<string, string | number>;
  attempts: number;
  createdAt: Date;
};

/** Tells what is due. Their program sees a delivery at least once, with the same id each time. */
export async function sendDeliveries(db: Database, now: Date): Promise<number> {
  const due = await claimDeliveries(db, now);
  await Promise.all(due.map((delivery) => deliver(db, delivery, now)));
  return due.length;
}

async function claimDeliveries(db: Database, now: Date): Promise<Due[]> {
  return db.transaction(async (tx) => {
    const due = await tx
      .select({
        id: webhookDeliveries.id,
        shopId: webhookDeliveries.shopId,
        webhookId: webhookDeliveries.webhookId,
        url: webhooks.url,
        event: webhookDeliveries.event,
        subject: webhookDeliveries.subject,
        attempts: webhookDeliveries.attempts,
        createdAt: webhookDeliveries.createdAt,
      })
      .from(webhookDeliveries)
      .innerJoin(webhooks, eq(webhooks.id, webhookDeliveries.webhookId))
      .where(and(eq(webhookDeliveries.state, 'waiting'), lte(webhookDeliveries.dueAt, now)))
      .orderBy(asc(webhookDeliveries.dueAt))
      .limit(atOnce)
      .for('update', { of: webhookDeliveries, skipLocked: true });
    if (due.length === 0) return [];
    await tx
      .update(webhookDeliveries)
      .set({
        dueAt: new Date(now.getTime() + leaseMs),
        attempts: sql`${webhookDeliveries.attempts} + 1`,
      })
      .where(
        inArray(
          webhookDeliveries.id,
          due.map(({ id }) => id),
        ),
      );
    return due;
  });
}

async function deliver(db: Database, delivery: Due, now: Date): Promise<void> {
  const { id, shopId, webhookId, url, event, subject, createdAt } = delivery;
  const body = JSON.stringify({ type: event, timestamp: createdAt.toISOString(), data: subject });
  const timestampS = Math.floor(now.getTime() / 1000);
  const signature = webhookSignature(webhookSecret(webhookId), { id, timestampS, body });
  const { isTaken, words } = await postSigned(url, body, {
    'webhook-id': id,
    'webhook-timestamp': String(timestampS),
    'webhook-signature': signature,
  });
  const wait = waitMinutes[delivery.attempts];
  await db
    .update(webhookDeliveries)
    .set({
      lastAnswer: words,
      ...(isTaken
        ? { state: 'taken' as const, takenAt: now }
        : wait === undefined
          ? { state: 'given-up' as const }
          : { dueAt: new Date(now.getTime() + wait * 60_000) }),
    })
    .where(
      and(
        eq(webhookDeliveries.shopId, shopId),
        eq(webhookDeliveries.id, id),
        eq(webhookDeliveries.state, 'waiting'),
      ),
    );
}
