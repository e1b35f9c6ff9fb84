import { and, asc, eq, isNull } from 'drizzle-orm';
import { people, shops } from '@/db/schema';
import { auth } from './auth';
import type { PersonContext, Shop } from './context';
import { database } from './database';
import { log } from './log';

/** Who asks and for which shop; null when nobody is signed in, or no shop has them any more. */
export async function personContext(headers: Headers): Promise<PersonContext | null> {
  const signedIn = await (await auth()).api.getSession({ headers });
  if (!signedIn) return null;
  const { db } = await database();
  const memberships = await db
    .select({
      personId: people.id,
      name: people.name,
      role: people.role,
      shop: shopFields,
    })
    .from(people)
    .innerJoin(shops, eq(shops.id, people.shopId))
    .where(and(eq(people.userId, signedIn.user.id), isNull(people.leftAt)))
    .orderBy(asc(people.createdAt), asc(people.id));
  const chosen =
    memberships.find(({ shop }) => shop.id === signedIn.session.activeShopId) ?? memberships[0];
  if (!chosen) return null;
  const { personId, name, role, shop } = chosen;
  return {
    shop,
    actor: { kind: 'person', personId, userId: signedIn.user.id, name, role },
    db,
    now: new Date(),
    log,
  };
}

export const shopFields = {
  id: shops.id,
  name: shops.name,
  phone: shops.phone,
  email: shops.email,
  region: shops.region,
  zone: shops.zone,
  rules: shops.rules,
  isSample: shops.isSample,
} satisfies Record<keyof Shop, unknown>;
