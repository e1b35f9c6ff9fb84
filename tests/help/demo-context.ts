import { and, eq } from 'drizzle-orm';
import { people, shops } from '@/db/schema';
import { seedDemo } from '@/db/seed/seed-demo';
import type { PersonContext } from '@/server/base/context';
import { database } from '@/server/base/database';
import { keepDemoSignOff } from '@/server/snags/keep-demo-sign-off';
import { makeVisitLink } from '@/server/visits/visit-link';

/** The demo's shop, seeded at an instant, seen by its owner. */
export async function demoContext(now: Date): Promise<PersonContext> {
  const { db } = await database();
  await seedDemo(db, {
    now,
    hashPassword: async (password) => `hash of ${password}`,
    linkVisit: (tx, { shopId, ...visit }) => makeVisitLink(tx, { shop: { id: shopId } }, visit),
    signOff: keepDemoSignOff,
  });
  const [found] = await db
    .select()
    .from(shops)
    .innerJoin(people, and(eq(people.shopId, shops.id), eq(people.role, 'owner')))
    .where(eq(shops.name, 'Juniper Bend Cabinet Works'));
  if (!found) throw new Error('the demo has no shop');
  const { id: personId, name } = found.people;
  return {
    shop: found.shops,
    actor: { kind: 'person', role: 'owner', personId, userId: '', name },
    db,
    now,
    log: () => {},
  };
}
