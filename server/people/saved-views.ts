import { and, asc, eq } from 'drizzle-orm';
import { savedViews } from '@/db/schema';
import type {
  ListViewsInput,
  SavedView,
  SaveViewInput,
  ViewIdInput,
} from '@/lib/contracts/saved-views';
import type { PersonContext } from '@/server/base/context';
import { mustBeAllowed } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

const mine = (ctx: PersonContext) =>
  and(eq(savedViews.shopId, ctx.shop.id), eq(savedViews.personId, ctx.actor.personId));

/** This person's own views of a table, by name. */
export async function listViews(
  ctx: PersonContext,
  { table }: ListViewsInput,
): Promise<SavedView[]> {
  mustBeAllowed(ctx, 'jobs:read');
  return ctx.db
    .select({ id: savedViews.id, name: savedViews.name, view: savedViews.view })
    .from(savedViews)
    .where(and(mine(ctx), eq(savedViews.shopId, ctx.shop.id), eq(savedViews.tableName, table)))
    .orderBy(asc(savedViews.name));
}

export async function saveView(ctx: PersonContext, input: SaveViewInput): Promise<SavedView> {
  mustBeAllowed(ctx, 'jobs:read');
  const { table: tableName, name, view } = input;
  const [saved] = await ctx.db
    .insert(savedViews)
    .values({ shopId: ctx.shop.id, personId: ctx.actor.personId, tableName, name, view })
    .onConflictDoUpdate({
      target: [savedViews.shopId, savedViews.personId, savedViews.tableName, savedViews.name],
      set: { view },
    })
    .returning({ id: savedViews.id });
  if (!saved) throw new Error('the view was not written');
  return { id: saved.id, name, view };
}

export async function forgetView(ctx: PersonContext, { viewId }: ViewIdInput): Promise<null> {
  mustBeAllowed(ctx, 'jobs:read');
  const gone = await ctx.db
    .delete(savedViews)
    .where(and(mine(ctx), eq(savedViews.shopId, ctx.shop.id), eq(savedViews.id, viewId)))
    .returning({ id: savedViews.id });
  if (gone.length === 0) throw notFound('view');
  return null;
}
