import { and, asc, eq, type SQL, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { Database } from '@/db/database';
import { customers, jobs, people, rooms, snags } from '@/db/schema';
import type { SnagView } from '@/lib/contracts/snags';
import { formatLocalDayShort } from '@/lib/time/format-civil';
import { localDate } from '@/lib/time/local-moment';
import type { PersonContext } from '@/server/base/context';
import { momentWords } from '@/server/walls/moment-words';

/** Snags as every screen shows them: the open ones first, the most pressing on top. */
export async function readSnags(
  db: Database,
  ctx: PersonContext,
  which: SQL | undefined,
): Promise<SnagView[]> {
  const closer = alias(people, 'closer');
  const rows = await db
    .select({
      id: snags.id,
      jobId: snags.jobId,
      jobNumber: jobs.number,
      customerName: customers.name,
      kind: snags.kind,
      roomId: snags.roomId,
      roomName: rooms.name,
      unitId: snags.unitId,
      place: snags.place,
      words: snags.words,
      mender: snags.mender,
      dueOn: snags.dueOn,
      photoIds: snags.photoIds,
      foundBy: people.name,
      foundAt: snags.foundAt,
      isAfterSignOff: snags.isAfterSignOff,
      benchSays: snags.benchSays,
      benchReadyOn: snags.benchReadyOn,
      closedAt: snags.closedAt,
      closedWords: snags.closedWords,
      closedPhotoIds: snags.closedPhotoIds,
      closedBy: closer.name,
    })
    .from(snags)
    .innerJoin(jobs, eq(jobs.id, snags.jobId))
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .innerJoin(people, eq(people.id, snags.foundBy))
    .leftJoin(rooms, eq(rooms.id, snags.roomId))
    .leftJoin(closer, eq(closer.id, snags.closedBy))
    .where(and(eq(snags.shopId, ctx.shop.id), which))
    .orderBy(
      sql`${snags.closedAt} is not null`,
      sql`${snags.dueOn} asc nulls last`,
      asc(snags.foundAt),
      asc(snags.id),
    );
  const today = localDate(ctx.now, ctx.shop.zone);
  const locale = { language: 'en', region: ctx.shop.region } as const;
  return rows.map((row) => ({
    ...row,
    dueWords: row.dueOn ? formatLocalDayShort(row.dueOn, locale) : null,
    isLate: row.closedAt === null && row.dueOn !== null && row.dueOn < today,
    foundAt: row.foundAt.toISOString(),
    foundWords: `${row.foundBy}, ${momentWords(ctx, row.foundAt)}`,
    closedAt: row.closedAt?.toISOString() ?? null,
  }));
}
