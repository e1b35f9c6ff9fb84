import { and, eq } from 'drizzle-orm';
import { tools } from '@/db/schema';
import type { ChangeToolInput } from '@/lib/contracts/tools';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound, Refusal } from '@/server/base/problem-response';

/** How far a tool may be off; every fit is sure by it from then on, and what is released stays. */
export async function changeTool(ctx: PersonContext, input: ChangeToolInput): Promise<void> {
  mustBeAllowed(ctx, 'shop:change');
  const { toolId, name, spec } = input;
  await ctx.db.transaction(async (tx) => {
    const isThis = and(eq(tools.shopId, ctx.shop.id), eq(tools.id, toolId));
    const [before] = await tx
      .select({ name: tools.name, spec: tools.spec })
      .from(tools)
      .where(isThis)
      .for('update');
    if (!before) throw notFound('tool');
    if (before.spec.kind !== spec.kind) throw anotherKind();
    await tx.update(tools).set({ name, spec }).where(isThis);
    await writeAudit(tx, ctx, {
      verb: 'change-tool',
      subjectKind: 'tool',
      subjectId: toolId,
      summary: `Tool ${name} changed`,
      detail: { before, given: { name, spec } },
    });
  });
}

function anotherKind(): Refusal {
  return new Refusal({
    status: 422,
    code: 'another-kind-of-tool',
    message: 'Readings hang on this tool, and another kind reads otherwise. Add it as a new tool.',
  });
}
