import { tools } from '@/db/schema';
import type { AddToolInput } from '@/lib/contracts/tools';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';

/** One more tool for the phones to choose from. */
export async function addTool(ctx: PersonContext, input: AddToolInput): Promise<{ id: string }> {
  mustBeAllowed(ctx, 'shop:change');
  const { name, spec } = input;
  return ctx.db.transaction(async (tx) => {
    const [added] = await tx
      .insert(tools)
      .values({ shopId: ctx.shop.id, name, spec })
      .returning({ id: tools.id });
    if (!added) throw new Error('the tool was not written');
    await writeAudit(tx, ctx, {
      verb: 'add-tool',
      subjectKind: 'tool',
      subjectId: added.id,
      summary: `Tool ${name} added`,
      detail: { spec },
    });
    return added;
  });
}
