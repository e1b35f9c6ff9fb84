import { and, asc, desc, eq, exists, gt, inArray } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { customers, jobs, messages, visits } from '@/db/schema';
import type { Answer } from './apply-answer';

/** Whose number it is: the provider's own is one for all shops, so every shop is looked through. */
type Sender = { shopId: string; customerId: string; name: string };
type LastTold = {
  customerId: string;
  visitId: string | null;
  jobId: string | null;
  occasion: string;
};
type Meant = Sender & { visitId: string; jobId: string };

export function findSenders(db: Database, phone: string): Promise<Sender[]> {
  return db
    .select({ shopId: customers.shopId, customerId: customers.id, name: customers.name })
    .from(customers)
    .where(eq(customers.phone, phone))
    .orderBy(desc(customers.createdAt), asc(customers.id));
}

/** The text that they have last on their phone is what they most likely answer. */
export async function findLastTold(db: Database, phone: string): Promise<LastTold | undefined> {
  const [last] = await db
    .select({
      customerId: messages.customerId,
      visitId: messages.visitId,
      jobId: messages.jobId,
      occasion: messages.occasion,
    })
    .from(messages)
    .where(
      and(
        eq(messages.toAddress, phone),
        eq(messages.channel, 'sms'),
        inArray(messages.state, ['sent', 'delivered']),
      ),
    )
    .orderBy(desc(messages.sentAt), desc(messages.id))
    .limit(1);
  return last;
}

/** The one visit that the answer can be about; null when none or several are, and no text asked about one. */
export async function findMeantVisit(
  db: Database,
  phone: string,
  known: { asked: Answer; lastTold: LastTold | undefined; now: Date },
): Promise<Meant | null> {
  const { asked, lastTold, now } = known;
  const open =
    asked.answer === 'confirm' ? ['booked' as const] : ['booked' as const, 'confirmed' as const];
  const wasTold = db
    .select({ id: messages.id })
    .from(messages)
    .where(
      and(
        eq(messages.shopId, visits.shopId),
        eq(messages.visitId, visits.id),
        eq(messages.toAddress, phone),
        inArray(messages.state, ['sent', 'delivered']),
      ),
    );
  const found = await db
    .select({
      shopId: visits.shopId,
      customerId: customers.id,
      name: customers.name,
      visitId: visits.id,
      jobId: visits.jobId,
    })
    .from(visits)
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .where(
      and(
        eq(customers.phone, phone),
        inArray(visits.status, open),
        gt(visits.startsAt, now),
        exists(wasTold),
      ),
    )
    .orderBy(asc(visits.startsAt));
  if (found.length === 1) return found[0] ?? null;
  if (lastTold?.occasion !== 'please-confirm') return null;
  return found.find(({ visitId }) => visitId === lastTold.visitId) ?? null;
}
