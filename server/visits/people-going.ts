import { and, count, eq } from 'drizzle-orm';
import { visitPiecePeople, visitPieces } from '@/db/schema';
import type { FindOpeningsInput } from '@/lib/contracts/openings';
import { doesKind } from '@/lib/schedule/visit-kind-words';
import type { Context } from '@/server/base/context';

/**
 * How many another time must have where nobody says: a measure that two go on takes two again, anything else is
 * for whoever can do it.
 */
export async function peopleGoing(
  ctx: Context,
  { visitId, kind }: Pick<FindOpeningsInput, 'visitId' | 'kind'>,
): Promise<number> {
  if (!visitId || doesKind[kind] !== 'measure') return 1;
  const pieces = await ctx.db
    .select({ people: count() })
    .from(visitPiecePeople)
    .innerJoin(visitPieces, eq(visitPieces.id, visitPiecePeople.pieceId))
    .where(and(eq(visitPieces.shopId, ctx.shop.id), eq(visitPieces.visitId, visitId)))
    .groupBy(visitPieces.id);
  return Math.max(1, ...pieces.map(({ people }) => people));
}
