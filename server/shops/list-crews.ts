import { and, asc, eq, isNull } from 'drizzle-orm';
import { crewPeople, crews, people } from '@/db/schema';
import type { CrewView } from '@/lib/contracts/visits';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';

/** The crews with who goes out in them; those who left the shop are not told. */
export async function listCrews(ctx: PersonContext): Promise<CrewView[]> {
  mustBeAllowed(ctx, 'people:read');
  const rows = await ctx.db
    .select({
      id: crews.id,
      name: crews.name,
      does: crews.does,
      colour: crews.colour,
      personId: people.id,
      personName: people.name,
    })
    .from(crews)
    .leftJoin(crewPeople, eq(crewPeople.crewId, crews.id))
    .leftJoin(people, and(eq(people.id, crewPeople.personId), isNull(people.leftAt)))
    .where(eq(crews.shopId, ctx.shop.id))
    .orderBy(asc(crews.does), asc(crews.name), asc(people.name), asc(people.id));
  const byId = new Map<string, CrewView>();
  for (const { personId, personName, ...row } of rows) {
    const crew = byId.get(row.id) ?? { ...row, people: [] };
    if (personId && personName) crew.people.push({ id: personId, name: personName });
    byId.set(row.id, crew);
  }
  return [...byId.values()];
}
