import { asc, eq } from 'drizzle-orm';
import { tools } from '@/db/schema';
import type { Tool } from '@/lib/contracts/wall-book';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';

/** The shop's measuring tools, oldest first, as the phone offers them. */
export async function listTools(ctx: PersonContext): Promise<Tool[]> {
  mustBeAllowed(ctx, 'shop:read');
  return ctx.db
    .select({ id: tools.id, name: tools.name, spec: tools.spec })
    .from(tools)
    .where(eq(tools.shopId, ctx.shop.id))
    .orderBy(asc(tools.createdAt), asc(tools.name), asc(tools.id));
}
