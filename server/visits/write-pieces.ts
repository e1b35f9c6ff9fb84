import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { visitPiecePeople, visitPieces } from '@/db/schema';
import type { Piece } from '@/lib/schedule';
import type { Context } from '@/server/base/context';
import type { Crew } from './lock-crew';

/** The busy time of a visit, for the crew and for each of its people; the database refuses overlaps. */
export async function writePieces(
  tx: Transaction,
  ctx: Context,
  visit: { visitId: string; crew: Crew; pieces: Piece[] },
): Promise<void> {
  const shopId = ctx.shop.id;
  const { visitId, crew } = visit;
  await removePieces(tx, ctx, visitId);
  const written = await tx
    .insert(visitPieces)
    .values(visit.pieces.map((piece) => ({ shopId, visitId, crewId: crew.id, ...piece })))
    .returning({
      pieceId: visitPieces.id,
      startsAt: visitPieces.startsAt,
      endsAt: visitPieces.endsAt,
    });
  const busy = written.flatMap((piece) =>
    crew.people.map(({ id }) => ({ shopId, personId: id, ...piece })),
  );
  if (busy.length > 0) await tx.insert(visitPiecePeople).values(busy);
}

/** Frees the time; the people's pieces go with the crew's. */
export async function removePieces(tx: Transaction, ctx: Context, visitId: string): Promise<void> {
  await tx
    .delete(visitPieces)
    .where(and(eq(visitPieces.shopId, ctx.shop.id), eq(visitPieces.visitId, visitId)));
}
