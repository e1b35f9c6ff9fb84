import { randomBytes } from 'node:crypto';
import { apiTokens } from '@/db/schema';
import type { MadeKey, MakeKeyInput } from '@/lib/contracts/programs';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { keyStart } from '@/server/base/key-context';
import { hashToken } from '@/server/base/secret';

/** A key for another program. It is given out this once; afterwards only its hash is here. */
export async function makeKey(ctx: PersonContext, input: MakeKeyInput): Promise<MadeKey> {
  mustBeAllowed(ctx, 'programs:change');
  const key = `${keyStart}${randomBytes(32).toString('base64url')}`;
  const id = await ctx.db.transaction(async (tx) => {
    const [made] = await tx
      .insert(apiTokens)
      .values({
        shopId: ctx.shop.id,
        name: input.name,
        tokenHash: hashToken(key),
        scopes: input.scopes,
        madeBy: ctx.actor.personId,
      })
      .returning({ id: apiTokens.id });
    if (!made) throw new Error('the key was not written');
    await writeAudit(tx, ctx, {
      verb: 'make-key',
      subjectKind: 'key',
      subjectId: made.id,
      summary: `Made a key for ${input.name}: ${input.scopes.join(', ')}`,
    });
    return made.id;
  });
  return { id, key };
}
