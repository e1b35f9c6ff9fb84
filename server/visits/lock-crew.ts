import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { crewPeople, crews, people } from '@/db/schema';
import type { Context } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { type CrewPlan, readCrewPlans } from '@/server/shops/crew-plans';

export type Crew = CrewPlan;

/**
 * The crew and its people, locked in one order until the transaction ends. Two bookings at once then wait
 * for each other in line: without it each can wait for the other's row in the exclusion constraint, and the
 * database ends such a knot by failing one of them after a second.
 */
export async function lockCrew(tx: Transaction, ctx: Context, crewId: string): Promise<Crew> {
  await tx
    .select({ id: crews.id })
    .from(crews)
    .where(and(eq(crews.shopId, ctx.shop.id), eq(crews.id, crewId)))
    .for('no key update');
  await tx
    .select({ id: people.id })
    .from(people)
    .innerJoin(crewPeople, eq(crewPeople.personId, people.id))
    .where(
      and(eq(people.shopId, ctx.shop.id), eq(crewPeople.crewId, crewId), isNull(people.leftAt)),
    )
    .orderBy(asc(people.id))
    .for('no key update', { of: people });
  const [crew] = await readCrewPlans(tx, ctx, [crewId]);
  if (!crew) throw notFound('crew');
  return crew;
}
