import { and, asc, eq, type SQL } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { people, signOffs } from '@/db/schema';
import type { SignOffView } from '@/lib/contracts/sign-offs';
import type { Context } from '@/server/base/context';
import { momentWords } from '@/server/walls/moment-words';
import { signOffSeal } from './sign-off-seal';

/** Sign-offs, oldest first, each with its seal worked out again. */
export async function readSignOffs(
  db: Database,
  ctx: Context,
  which: SQL | undefined,
): Promise<SignOffView[]> {
  const rows = await db
    .select({ record: signOffs, takenByName: people.name })
    .from(signOffs)
    .innerJoin(people, eq(people.id, signOffs.takenBy))
    .where(and(eq(signOffs.shopId, ctx.shop.id), which))
    .orderBy(asc(signOffs.signedAt), asc(signOffs.id));
  return rows.map(({ record, takenByName }) => ({
    id: record.id,
    visitId: record.visitId,
    name: record.name,
    language: record.language,
    statement: record.statement,
    strokes: record.strokes,
    snags: record.snags,
    signedAt: record.signedAt.toISOString(),
    signedWords: momentWords(ctx, record.signedAt),
    takenBy: takenByName,
    isUntouched: record.seal === signOffSeal(record),
  }));
}
