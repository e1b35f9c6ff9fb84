import { randomUUID } from 'node:crypto';
import { and, eq, isNull } from 'drizzle-orm';
import { people, shops } from '@/db/schema';
import { seedSample } from '@/db/seed/seed-sample';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { keepDemoSignOff } from '@/server/snags/keep-demo-sign-off';
import { makeVisitLink } from '@/server/visits/visit-link';

/** A shop in the middle of its work, beside one's own: nobody is told anything from it. One at a time. */
export async function startSample(ctx: PersonContext): Promise<{ shopId: string }> {
  mustBeAllowed(ctx, 'shop:change');
  const { shop, actor, now } = ctx;
  if (shop.isSample) throw isOne();
  const shopId = randomUUID();
  await ctx.db.transaction(async (tx) => {
    const [own] = await tx
      .select({ id: shops.id })
      .from(shops)
      .innerJoin(people, eq(people.shopId, shops.id))
      .where(and(eq(shops.isSample, true), eq(people.userId, actor.userId), isNull(people.leftAt)));
    if (own) throw isOne();
    const { region, zone, rules, name } = shop;
    await seedSample(
      tx,
      {
        id: shopId,
        name: `Sample beside ${name}`,
        region,
        zone,
        rules,
        owner: { userId: actor.userId, name: actor.name },
      },
      {
        now,
        linkVisit: (inner, { shopId: id, ...visit }) =>
          makeVisitLink(inner, { shop: { id } }, visit),
        signOff: keepDemoSignOff,
      },
    );
    await writeAudit(tx, ctx, {
      verb: 'start-sample',
      subjectKind: 'person',
      subjectId: actor.personId,
      summary: 'Made a sample shop to play with',
    });
  });
  return { shopId };
}

function isOne(): Refusal {
  return new Refusal({
    status: 409,
    code: 'sample-exists',
    message: 'There is a sample shop already. Switch to it, or remove it first.',
  });
}
