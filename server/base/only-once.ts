import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { idempotencyKeys } from '@/db/schema';
import type { Context } from './context';

/**
 * Does a write that may be sent twice, once: the second call gets the first's answer. Two at the same
 * moment: the key's row makes the second wait for the first. A refusal takes the key back with it.
 */
export async function onlyOnce<T extends object>(
  tx: Transaction,
  ctx: Context,
  call: { verb: string; key: string },
  work: () => Promise<T>,
): Promise<T> {
  const shopId = ctx.shop.id;
  const [mine] = await tx
    .insert(idempotencyKeys)
    .values({ shopId, ...call, answer: {} })
    .onConflictDoNothing({
      target: [idempotencyKeys.shopId, idempotencyKeys.verb, idempotencyKeys.key],
    })
    .returning({ id: idempotencyKeys.id });
  if (!mine) {
    const [first] = await tx
      .select({ answer: idempotencyKeys.answer })
      .from(idempotencyKeys)
      .where(
        and(
          eq(idempotencyKeys.shopId, shopId),
          eq(idempotencyKeys.verb, call.verb),
          eq(idempotencyKeys.key, call.key),
        ),
      );
    if (!first) throw new Error('the first answer is gone');
    return first.answer as T;
  }
  const answer = await work();
  await tx.update(idempotencyKeys).set({ answer }).where(eq(idempotencyKeys.id, mine.id));
  return answer;
}
