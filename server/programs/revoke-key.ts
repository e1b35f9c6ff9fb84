import { and, eq, isNull } from 'drizzle-orm';
import { apiTokens } from '@/db/schema';
import type { KeyIdInput } from '@/lib/contracts/programs';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

/** From now on nobody gets in with it. */
export async function revokeKey(ctx: PersonContext, { keyId }: KeyIdInput): Promise<null> {
  mustBeAllowed(ctx, 'programs:change');
  await ctx.db.transaction(async (tx) => {
    const [revoked] = await tx
      .update(apiTokens)
      .set({ revokedAt: ctx.now })
      .where(
        and(
          eq(apiTokens.shopId, ctx.shop.id),
          eq(apiTokens.id, keyId),
          isNull(apiTokens.revokedAt),
        ),
      )
      .returning({ name: apiTokens.name });
    if (!revoked) throw notFound('key');
    await writeAudit(tx, ctx, {
      verb: 'revoke-key',
      subjectKind: 'key',
      subjectId: keyId,
      summary: `Took back the key of ${revoked.name}`,
    });
  });
  return null;
}
