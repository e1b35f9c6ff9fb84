import { and, asc, eq } from 'drizzle-orm';
import { z } from 'zod';
import type { Transaction } from '@/db/database';
import { visitPieces, visits } from '@/db/schema';
import { visitStatus } from '@/lib/contracts/visits';
import type { Context } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

const instant = z.coerce.date();

/** How a visit stood: all that has to be put back when a change of it is taken back. */
export const visitStanding = z.object({
  version: z.number().int(),
  crewId: z.uuid(),
  status: visitStatus,
  startsAt: instant,
  endsAt: instant,
  windowStartsAt: instant,
  windowEndsAt: instant,
  workMinutes: z.number().int(),
  confirmedAt: instant.nullable(),
  customerSays: z.string(),
  pieces: z.array(z.object({ startsAt: instant, endsAt: instant })),
});
export type VisitStanding = z.infer<typeof visitStanding>;

/** Read before a change, and kept in the detail of its audit line. */
export async function readStanding(
  tx: Transaction,
  ctx: Context,
  visitId: string,
): Promise<VisitStanding> {
  const [visit] = await tx
    .select({
      version: visits.version,
      crewId: visits.crewId,
      status: visits.status,
      startsAt: visits.startsAt,
      endsAt: visits.endsAt,
      windowStartsAt: visits.windowStartsAt,
      windowEndsAt: visits.windowEndsAt,
      workMinutes: visits.workMinutes,
      confirmedAt: visits.confirmedAt,
      customerSays: visits.customerSays,
    })
    .from(visits)
    .where(and(eq(visits.shopId, ctx.shop.id), eq(visits.id, visitId)));
  if (!visit) throw notFound('visit');
  const pieces = await tx
    .select({ startsAt: visitPieces.startsAt, endsAt: visitPieces.endsAt })
    .from(visitPieces)
    .where(and(eq(visitPieces.shopId, ctx.shop.id), eq(visitPieces.visitId, visitId)))
    .orderBy(asc(visitPieces.startsAt));
  return { ...visit, pieces };
}
