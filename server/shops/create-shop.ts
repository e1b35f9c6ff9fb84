import { randomUUID } from 'node:crypto';
import { people, shops, tools } from '@/db/schema';
import type { CreateShopInput } from '@/lib/contracts/people';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { isZone } from '@/lib/time/zones';
import { writeAudit } from '@/server/base/audit';
import { database } from '@/server/base/database';
import { countTry } from '@/server/base/limits';
import { log } from '@/server/base/log';
import { Refusal } from '@/server/base/problem-response';
import { createUser } from '@/server/people/create-user';
import { hashPassword } from '@/server/people/sign-in';
import { startingTools } from './starting-tools';

/** A new shop with its owner, rules and tools: all of it or nothing. */
export async function createShop(input: CreateShopInput, from: string) {
  const { db } = await database();
  const now = new Date();
  await countTry(db, `create-shop:${from}`, { most: 10, windowSeconds: 3600 }, now);
  if (!isZone(input.zone)) {
    throw new Refusal({
      status: 422,
      code: 'no-such-zone',
      message: 'That time zone is not known.',
      errors: { zone: 'Pick a zone from the list.' },
    });
  }
  const passwordHash = await hashPassword(input.password);
  const shop = {
    id: randomUUID(),
    name: input.shopName,
    phone: '',
    email: input.email,
    region: input.region,
    zone: input.zone,
    rules: rulesFor(input),
  };
  await db.transaction(async (tx) => {
    const userId = await createUser(tx, {
      name: input.personName,
      email: input.email,
      passwordHash,
    });
    if (!userId) {
      throw new Refusal({
        status: 409,
        code: 'email-taken',
        message: 'This e-mail signs in to Setwell already. Sign in, or use another address.',
        errors: { email: 'Signs in already.' },
      });
    }
    await tx.insert(shops).values(shop);
    const [owner] = await tx
      .insert(people)
      .values({ shopId: shop.id, userId, name: input.personName, role: 'owner' })
      .returning({ id: people.id });
    if (!owner) throw new Error('the owner was not written');
    await tx
      .insert(tools)
      .values(startingTools(input.unit).map((tool) => ({ shopId: shop.id, ...tool })));
    await writeAudit(
      tx,
      { shop, actor: { kind: 'system', name: input.personName }, db, now, log },
      {
        verb: 'create-shop',
        subjectKind: 'person',
        subjectId: owner.id,
        summary: 'Started the shop',
      },
    );
  });
  return { shopId: shop.id };
}

/** The region's rules, in the unit that this shop thinks in. */
function rulesFor(input: CreateShopInput) {
  const rules = defaultShopRules(input.region);
  if (rules.fit.unit === input.unit) return rules;
  const stepMm = input.unit === 'in' ? 25.4 / 16 : 1;
  return { ...rules, fit: { ...rules.fit, unit: input.unit, stepMm, scribeStepMm: stepMm } };
}
