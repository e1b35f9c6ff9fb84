import { and, asc, eq } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { people, visitPiecePeople, visitPieces } from '@/db/schema';
import type { Context } from '@/server/base/context';

/** First names of who comes: enough at the door, and no more of theirs than that. */
export async function whoComes(db: Database, ctx: Context, visitId: string): Promise<string[]> {
  const found = await db
    .selectDistinct({ id: people.id, name: people.name })
    .from(visitPieces)
    .innerJoin(visitPiecePeople, eq(visitPiecePeople.pieceId, visitPieces.id))
    .innerJoin(people, eq(people.id, visitPiecePeople.personId))
    .where(and(eq(visitPieces.shopId, ctx.shop.id), eq(visitPieces.visitId, visitId)))
    .orderBy(asc(people.name), asc(people.id));
  return found.map(({ name }) => name.split(' ')[0] ?? name);
}
