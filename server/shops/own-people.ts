import { and, eq, inArray, isNull } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { people } from '@/db/schema';
import type { Context } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

/** Refuses where one of them is not of this shop, or has left it. */
export async function mustBeOurPeople(
  tx: Transaction,
  ctx: Context,
  personIds: string[],
): Promise<void> {
  if (personIds.length === 0) return;
  const ours = await tx
    .select({ id: people.id })
    .from(people)
    .where(
      and(eq(people.shopId, ctx.shop.id), inArray(people.id, personIds), isNull(people.leftAt)),
    );
  if (ours.length < new Set(personIds).size) throw notFound('person');
}
