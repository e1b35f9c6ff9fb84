import { and, asc, eq, isNull } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { crewPeople, people, visits } from '@/db/schema';
import type { Context } from '@/server/base/context';

/** First names of who comes: enough at the door, and no more of theirs than that. */
export async function whoComes(db: Database, ctx: Context, visitId: string): Promise<string[]> {
  const found = await db
    .select({ name: people.name })
    .from(visits)
    .innerJoin(crewPeople, eq(crewPeople.crewId, visits.crewId))
    .innerJoin(people, and(eq(people.id, crewPeople.personId), isNull(people.leftAt)))
    .where(and(eq(visits.shopId, ctx.shop.id), eq(visits.id, visitId)))
    .orderBy(asc(people.name), asc(people.id));
  return found.map(({ name }) => name.split(' ')[0] ?? name);
}
