import { and, asc, eq, isNull } from 'drizzle-orm';
import { people, user } from '@/db/schema';
import type { PersonView } from '@/lib/contracts/people';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';

export async function listPeople(ctx: PersonContext): Promise<PersonView[]> {
  mustBeAllowed(ctx, 'people:read');
  return ctx.db
    .select({ id: people.id, name: people.name, role: people.role, email: user.email })
    .from(people)
    .leftJoin(user, eq(user.id, people.userId))
    .where(and(eq(people.shopId, ctx.shop.id), isNull(people.leftAt)))
    .orderBy(asc(people.name), asc(people.id));
}
