import { and, eq, inArray, type SQL } from 'drizzle-orm';
import { crewPeople, visits } from '@/db/schema';
import type { PersonContext } from '@/server/base/context';

/** Fitters and measurers see the visits of their own crews; owner, scheduler and bench see all. */
export function ofOwnCrews(ctx: PersonContext): SQL | undefined {
  const { role, personId } = ctx.actor;
  if (role !== 'measurer' && role !== 'crew') return undefined;
  const own = ctx.db
    .select({ crewId: crewPeople.crewId })
    .from(crewPeople)
    .where(and(eq(crewPeople.shopId, ctx.shop.id), eq(crewPeople.personId, personId)));
  return inArray(visits.crewId, own);
}
