import { and, asc, desc, eq, exists, gt, inArray, type SQL } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { customers, jobs, messages, visits } from '@/db/schema';
import type { MessageCause } from '@/lib/contracts/messages';
import type { Answer } from './apply-answer';

/** Whose number it is: the provider's own is one for all shops, so every shop is looked through. */
export type Sender = { shopId: string; customerId: string; name: string };
export type LastTold = {
  customerId: string;
  visitId: string | null;
  jobId: string | null;
  occasion: string;
  cause: MessageCause;
};
export type Meant = Sender & { visitId: string; jobId: string };

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
      cause: messages.cause,
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

/**
 * The visits that the answer can be about, soonest first, and the one that is meant: the only one, or the
 * one that the last text asked about; null when it could be any of several.
 */
export async function findMeantVisits(
  db: Database,
  phone: string,
  known: { asked: Answer; lastTold: LastTold | undefined; now: Date },
): Promise<{ meant: Meant | null; open: Meant[] }> {
  const { asked, lastTold, now } = known;
  const statuses =
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
  const open = await readVisitsOf(
    db,
    phone,
    and(inArray(visits.status, statuses), gt(visits.startsAt, now), exists(wasTold)),
  );
  if (open.length === 1) return { meant: open[0] ?? null, open };
  const wasAsked = ['please-confirm', 'asked-again'].includes(lastTold?.occasion ?? '');
  const asking = wasAsked ? open.find(({ visitId }) => visitId === lastTold?.visitId) : undefined;
  return { meant: asking ?? null, open };
}

/** One visit, if it is of somebody with this number. */
export async function findVisitOf(
  db: Database,
  phone: string,
  visitId: string,
): Promise<Meant | undefined> {
  const [found] = await readVisitsOf(db, phone, eq(visits.id, visitId));
  return found;
}

function readVisitsOf(db: Database, phone: string, which: SQL | undefined): Promise<Meant[]> {
  return db
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
    .where(and(eq(customers.phone, phone), which))
    .orderBy(asc(visits.startsAt));
}
