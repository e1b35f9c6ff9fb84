import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { visitPiecePeople, visitPieces } from '@/db/schema';
import type { Piece } from '@/lib/schedule';
import { localDate } from '@/lib/time/local-moment';
import type { Context } from '@/server/base/context';
import { whoGoes } from '@/server/shops/crew-plans';
import { lapseHolds } from './lapse-holds';
import type { Crew } from './lock-crew';

/**
 * The busy time of a visit, for the crew and for each of its people; the database refuses overlaps. Holds that
 * are over stand in nobody's way.
 */
export async function writePieces(
  tx: Transaction,
  ctx: Context,
  visit: { visitId: string; crew: Crew; pieces: Piece[] },
): Promise<void> {
  const shopId = ctx.shop.id;
  const { visitId, crew } = visit;
  await lapseHolds(tx, ctx);
  await removePieces(tx, ctx, visitId);
  const written = await tx
    .insert(visitPieces)
    .values(visit.pieces.map((piece) => ({ shopId, visitId, crewId: crew.id, ...piece })))
    .returning({
      pieceId: visitPieces.id,
      startsAt: visitPieces.startsAt,
      endsAt: visitPieces.endsAt,
    });
  await writePiecePeople(tx, ctx, crew, written);
}

/** Who goes is settled for each day: a person may go with another crew on the next. */
export async function writePiecePeople(
  tx: Transaction,
  ctx: Context,
  crew: Crew,
  pieces: (Piece & { pieceId: string })[],
): Promise<void> {
  const { id: shopId, zone } = ctx.shop;
  const busy = pieces.flatMap((piece) =>
    whoGoes(crew, localDate(piece.startsAt, zone)).map(({ id }) => ({
      shopId,
      personId: id,
      ...piece,
    })),
  );
  if (busy.length > 0) await tx.insert(visitPiecePeople).values(busy);
}

/** Frees the time; the people's pieces go with the crew's. */
export async function removePieces(tx: Transaction, ctx: Context, visitId: string): Promise<void> {
  await tx
    .delete(visitPieces)
    .where(and(eq(visitPieces.shopId, ctx.shop.id), eq(visitPieces.visitId, visitId)));
}
