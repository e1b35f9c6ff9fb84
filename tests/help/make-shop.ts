import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { people, shops } from '@/db/schema';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { type Role, roles } from '@/lib/permissions';
import type { PersonContext, Shop } from '@/server/base/context';
import { database } from '@/server/base/database';
import { createUser } from '@/server/people/create-user';
import { hashPassword, signedInResponse } from '@/server/people/sign-in';

const password = 'test-password';
let passwordHash: Promise<string> | null = null;

export type TestPerson = { personId: string; userId: string; email: string; role: Role };
export type TestShop = { shop: Shop; people: Record<Role, TestPerson> };

/** A shop of its own for a test, with one person in each role. */
export async function makeShop(
  options: { region?: Shop['region']; zone?: string; name?: string } = {},
): Promise<TestShop> {
  const { db } = await database();
  passwordHash ??= hashPassword(password);
  const hash = await passwordHash;
  const id = randomUUID();
  const region = options.region ?? 'US';
  const shop: Shop = {
    id,
    name: options.name ?? `Shop ${id.slice(0, 4)}`,
    phone: '+12125550142',
    email: `office-${id.slice(0, 8)}@shop.example`,
    region,
    zone: options.zone ?? 'America/New_York',
    rules: defaultShopRules(region),
  };
  const made = await db.transaction(async (tx) => {
    await tx.insert(shops).values(shop);
    const entries: [Role, TestPerson][] = [];
    for (const role of roles) {
      const email = `${role}-${id.slice(0, 8)}@shop.example`;
      const name = `${role[0]?.toUpperCase()}${role.slice(1)} Test`;
      const userId = await createUser(tx, { name, email, passwordHash: hash });
      if (!userId) throw new Error('the test person was not made');
      const [person] = await tx
        .insert(people)
        .values({ shopId: id, userId, name, role })
        .returning({ id: people.id });
      if (!person) throw new Error('the test person was not made');
      entries.push([role, { personId: person.id, userId, email, role }]);
    }
    return Object.fromEntries(entries) as Record<Role, TestPerson>;
  });
  return { shop, people: made };
}

/** A context as `handle` makes it, for calling a verb without HTTP. */
export async function contextOf(
  { shop, people: staff }: TestShop,
  role: Role,
  now = new Date('2026-12-01T15:00:00Z'),
): Promise<PersonContext> {
  const { db } = await database();
  const [fresh] = await db.select({ rules: shops.rules }).from(shops).where(eq(shops.id, shop.id));
  const { personId, userId } = staff[role];
  return {
    shop: { ...shop, rules: fresh?.rules ?? shop.rules },
    actor: { kind: 'person', personId, userId, name: `${role} of ${shop.name}`, role },
    db,
    now,
    log: () => {},
  };
}

/** The cookie of a real sign-in. */
export async function cookieOf(person: TestPerson): Promise<string> {
  const response = await signedInResponse(person.email, password, new Headers());
  const cookies = response.headers.getSetCookie().map((cookie) => cookie.split(';')[0]);
  if (response.status !== 200 || cookies.length === 0) throw new Error('sign-in failed');
  return cookies.join('; ');
}
