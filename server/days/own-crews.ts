import { and, eq, inArray, type SQL } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { crewPeople, visits } from '@/db/schema';
import type { PersonContext } from '@/server/base/context';

/** Fitters and measurers see the visits of their own crews; owner, scheduler and bench see all. */
export function ofOwnCrews(ctx: PersonContext): SQL | undefined {
  const { role } = ctx.actor;
  return role === 'measurer' || role === 'crew' ? ofCrewsWithThem(ctx) : undefined;
}

/** The visits of the crews that this person goes with, whatever the role. */
export function ofCrewsWithThem(ctx: PersonContext): SQL {
  const own = ctx.db
    .select({ crewId: crewPeople.crewId })
    .from(crewPeople)
    .where(and(eq(crewPeople.shopId, ctx.shop.id), eq(crewPeople.personId, ctx.actor.personId)));
  return inArray(visits.crewId, own);
}

/** Whether this person is of that crew, whatever the role. */
export async function isOfOwnCrew(
  db: Database,
  ctx: PersonContext,
  crewId: string,
): Promise<boolean> {
  const [own] = await db
    .select({ crewId: crewPeople.crewId })
    .from(crewPeople)
    .where(
      and(
        eq(crewPeople.shopId, ctx.shop.id),
        eq(crewPeople.crewId, crewId),
        eq(crewPeople.personId, ctx.actor.personId),
      ),
    );
  return own !== undefined;
}
