import { and, eq } from 'drizzle-orm';
import { visits } from '@/db/schema';
import type { HeldVisitInput } from '@/lib/contracts/openings';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { lockHeld } from './take-held-time';

/** The time is free again for everybody. Nobody was told of it, so nobody is told now. */
export async function letGoHeldTime(
  ctx: PersonContext,
  { visitId }: HeldVisitInput,
): Promise<{ visitId: string }> {
  mustBeAllowed(ctx, 'visits:book');
  await ctx.db.transaction(async (tx) => {
    const held = await lockHeld(tx, ctx, visitId);
    await tx.delete(visits).where(and(eq(visits.shopId, ctx.shop.id), eq(visits.id, held.id)));
  });
  return { visitId };
}
