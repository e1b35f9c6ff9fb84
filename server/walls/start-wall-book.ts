import { and, asc, eq } from 'drizzle-orm';
import { customers, jobs, tools } from '@/db/schema';
import type { WallBookView } from '@/lib/contracts/rooms';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

/** A book with no walls yet, for a room that is about to be drawn; nothing is written until it is. */
export async function startWallBook(
  ctx: PersonContext,
  { roomId, jobId }: { roomId: string; jobId: string },
): Promise<WallBookView> {
  mustBeAllowed(ctx, 'walls:measure');
  const [job] = await ctx.db
    .select({ title: jobs.title, customerName: customers.name })
    .from(jobs)
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .where(and(eq(jobs.shopId, ctx.shop.id), eq(jobs.id, jobId)));
  if (!job) throw notFound('job');
  const shopTools = await ctx.db
    .select({ id: tools.id, name: tools.name, spec: tools.spec })
    .from(tools)
    .where(eq(tools.shopId, ctx.shop.id))
    .orderBy(asc(tools.createdAt), asc(tools.name));
  const room = { id: roomId, name: '', chains: [], wallThicknessToComeMm: 0, floorToComeMm: 0 };
  return {
    jobId,
    jobTitle: job.title,
    customerName: job.customerName,
    wallBook: { room, readings: [], tools: shopTools },
    runs: [],
    rules: ctx.shop.rules.fit,
    missing: [],
    tools: shopTools,
    submittedAt: null,
    readers: [],
  };
}
