import { and, eq, gt, inArray, notInArray } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { crews, people, visitPiecePeople, visitPieces, visits } from '@/db/schema';
import { formatDayShort, formatWindowShort } from '@/lib/time/format-instant';
import { localDate } from '@/lib/time/local-moment';
import type { PersonContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { whoGoes } from '@/server/shops/crew-plans';
import { lockCrew } from './lock-crew';
import { movableStatuses } from './visits-outside';
import { writePiecePeople } from './write-pieces';

/**
 * Who goes on the visits to come of these crews, by what the crews are now. Refused, with who and when, where
 * somebody would be in two places; the database is the judge.
 */
export async function settlePeople(
  tx: Transaction,
  ctx: PersonContext,
  crewIds: string[],
): Promise<void> {
  const shopId = ctx.shop.id;
  for (const crewId of [...crewIds].sort()) {
    const crew = await lockCrew(tx, ctx, crewId);
    const pieces = await tx
      .select({
        pieceId: visitPieces.id,
        startsAt: visitPieces.startsAt,
        endsAt: visitPieces.endsAt,
      })
      .from(visitPieces)
      .innerJoin(visits, eq(visits.id, visitPieces.visitId))
      .where(
        and(
          eq(visitPieces.shopId, shopId),
          eq(visitPieces.crewId, crewId),
          gt(visitPieces.startsAt, ctx.now),
          inArray(visits.status, [...movableStatuses]),
        ),
      );
    if (pieces.length === 0) continue;
    const pieceIds = pieces.map(({ pieceId }) => pieceId);
    await tx
      .delete(visitPiecePeople)
      .where(and(eq(visitPiecePeople.shopId, shopId), inArray(visitPiecePeople.pieceId, pieceIds)));
    const due = pieces.map((piece) => ({
      ...piece,
      personIds: whoGoes(crew, localDate(piece.startsAt, ctx.shop.zone)).map(({ id }) => id),
    }));
    await mustBeFree(tx, ctx, due);
    await writePiecePeople(tx, ctx, crew, pieces);
  }
}

type Due = { pieceId: string; startsAt: Date; endsAt: Date; personIds: string[] };

async function mustBeFree(tx: Transaction, ctx: PersonContext, due: Due[]): Promise<void> {
  const personIds = [...new Set(due.flatMap((piece) => piece.personIds))];
  if (personIds.length === 0) return;
  const taken = await tx
    .select({
      personId: people.id,
      name: people.name,
      crewName: crews.name,
      startsAt: visitPiecePeople.startsAt,
      endsAt: visitPiecePeople.endsAt,
    })
    .from(visitPiecePeople)
    .innerJoin(people, eq(people.id, visitPiecePeople.personId))
    .innerJoin(visitPieces, eq(visitPieces.id, visitPiecePeople.pieceId))
    .innerJoin(crews, eq(crews.id, visitPieces.crewId))
    .where(
      and(
        eq(visitPiecePeople.shopId, ctx.shop.id),
        inArray(visitPiecePeople.personId, personIds),
        gt(visitPiecePeople.endsAt, ctx.now),
        notInArray(
          visitPiecePeople.pieceId,
          due.map(({ pieceId }) => pieceId),
        ),
      ),
    );
  for (const { personId, name, crewName, startsAt, endsAt } of taken) {
    const clash = due.find(
      (piece) =>
        piece.personIds.includes(personId) && piece.startsAt < endsAt && startsAt < piece.endsAt,
    );
    if (!clash) continue;
    const { zone, region } = ctx.shop;
    const locale = { language: 'en', region } as const;
    const when = `${formatDayShort(startsAt, zone, locale)}, ${formatWindowShort({ from: startsAt, until: endsAt }, zone, locale)}`;
    throw new Refusal({
      status: 409,
      code: 'person-already-booked',
      message: `Nothing was changed. ${name} is with ${crewName} on ${when}: move one of the two visits first, or leave out that weekday.`,
    });
  }
}
