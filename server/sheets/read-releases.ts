import { and, desc, eq, sql } from 'drizzle-orm';
import { alias } from 'drizzle-orm/pg-core';
import type { Database } from '@/db/database';
import { people, releaseReceipts, releases } from '@/db/schema';
import type { ReleaseRow } from '@/lib/contracts/rooms';
import type { FrozenSheet } from '@/lib/sheet/sheet-changes';
import type { PersonContext } from '@/server/base/context';
import { momentWords } from '@/server/walls/moment-words';
import { newestReleases } from '@/server/walls/newest-releases';

/** The revisions of a room, newest first. Every one but the newest is superseded; the newest may be. */
export async function readReleases(
  db: Database,
  ctx: PersonContext,
  roomId: string,
): Promise<ReleaseRow[]> {
  const bench = alias(people, 'bench');
  const rows = await db
    .select({
      id: releases.id,
      revision: releases.revision,
      changes: releases.changes,
      releasedAt: releases.releasedAt,
      releasedBy: people.name,
      takenUpAt: releaseReceipts.takenUpAt,
      takenUpBy: bench.name,
    })
    .from(releases)
    .innerJoin(people, eq(people.id, releases.releasedBy))
    .leftJoin(releaseReceipts, eq(releaseReceipts.releaseId, releases.id))
    .leftJoin(bench, eq(bench.id, releaseReceipts.takenUpBy))
    .where(and(eq(releases.shopId, ctx.shop.id), eq(releases.roomId, roomId)))
    .orderBy(...newestFirst);
  const newest = (await newestReleases(db, ctx, [roomId])).get(roomId);
  return rows.map(({ releasedAt, takenUpAt, takenUpBy, ...row }) => ({
    ...row,
    releasedAtWords: momentWords(ctx, releasedAt),
    takenUpWords: takenUpAt ? `${takenUpBy}, ${momentWords(ctx, takenUpAt)}` : null,
    isSuperseded: row.id !== newest?.releaseId || newest.isSuperseded,
  }));
}

/** What one revision froze; null where this room has none of that letter. */
export async function readFrozen(
  db: Database,
  ctx: PersonContext,
  { roomId, revision }: { roomId: string; revision: string },
) {
  const [found] = await db
    .select({
      overrideReason: releases.overrideReason,
      engineVersion: releases.engineVersion,
      wallBook: releases.wallBook,
      runs: releases.runs,
      rules: releases.rules,
      fit: releases.fit,
    })
    .from(releases)
    .where(
      and(
        eq(releases.shopId, ctx.shop.id),
        eq(releases.roomId, roomId),
        eq(releases.revision, revision),
      ),
    );
  return found ?? null;
}

/** What the newest revision froze; null before the first. */
export async function readNewestFrozen(
  db: Database,
  ctx: PersonContext,
  roomId: string,
): Promise<(FrozenSheet & { revision: string }) | null> {
  const [found] = await db
    .select({
      revision: releases.revision,
      wallBook: releases.wallBook,
      runs: releases.runs,
      rules: releases.rules,
      fit: releases.fit,
    })
    .from(releases)
    .where(and(eq(releases.shopId, ctx.shop.id), eq(releases.roomId, roomId)))
    .orderBy(...newestFirst)
    .limit(1);
  return found ?? null;
}

/** A … Z before AA. */
const newestFirst = [desc(sql`length(${releases.revision})`), desc(releases.revision)];
