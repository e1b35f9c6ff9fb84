import { and, desc, eq, inArray, sql } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { readings, releases, rooms } from '@/db/schema';
import type { Room } from '@/lib/contracts/wall-book';
import { type BookLine, standingReadings } from '@/lib/measure/standing-readings';
import { sheetKey } from '@/lib/sheet/sheet-key';
import type { Context } from '@/server/base/context';
import { readChains } from './read-chains';
import { readRuns } from './read-runs';

export type NewestRelease = {
  releaseId: string;
  revision: string;
  releasedAt: Date;
  /** What out-of-true walls add to the install, by its fit; minutes of one person. */
  extraInstallMinutes: number;
  /** Readings, walls or runs changed after it. */
  isSuperseded: boolean;
};

/** The newest revision of each of these rooms, and whether it still holds; in a few queries for all. */
export async function newestReleases(
  db: Database,
  ctx: Context,
  roomIds: string[],
): Promise<Map<string, NewestRelease>> {
  const frozen = await db
    .selectDistinctOn([releases.roomId], {
      roomId: releases.roomId,
      releaseId: releases.id,
      revision: releases.revision,
      releasedAt: releases.releasedAt,
      extraInstallMinutes: sql<number>`coalesce((${releases.fit} -> 'extraInstallMinutes' ->> 'minutes')::float8, 0)`,
      standingIds: releases.readingIds,
      runs: releases.runs,
      room: sql<Room>`${releases.wallBook} -> 'room'`,
    })
    .from(releases)
    .where(and(eq(releases.shopId, ctx.shop.id), inArray(releases.roomId, roomIds)))
    .orderBy(releases.roomId, desc(sql`length(${releases.revision})`), desc(releases.revision));
  const keys = await keysNow(
    db,
    ctx,
    frozen.map(({ roomId }) => roomId),
  );
  return new Map(
    frozen.map(({ roomId, standingIds, runs, room, ...release }) => [
      roomId,
      {
        ...release,
        isSuperseded: sheetKey({ standingIds, runs, room }) !== keys.get(roomId),
      },
    ]),
  );
}

async function keysNow(
  db: Database,
  ctx: Context,
  roomIds: string[],
): Promise<Map<string, string>> {
  if (roomIds.length === 0) return new Map();
  const rows = await db
    .select({
      id: rooms.id,
      name: rooms.name,
      wallThicknessToComeMm: rooms.wallThicknessToComeMm,
      floorToComeMm: rooms.floorToComeMm,
      cabinetsStandOn: rooms.cabinetsStandOn,
    })
    .from(rooms)
    .where(and(eq(rooms.shopId, ctx.shop.id), inArray(rooms.id, roomIds)));
  const lines = await readLines(db, ctx, roomIds);
  const chains = await readChains(db, ctx, roomIds);
  const runs = await readRuns(db, ctx, roomIds);
  return new Map(
    rows.map(({ cabinetsStandOn, ...row }) => [
      row.id,
      sheetKey({
        room: {
          ...row,
          chains: chains.get(row.id) ?? [],
          ...(cabinetsStandOn ? { cabinetsStandOn } : {}),
        },
        runs: runs.get(row.id) ?? [],
        standingIds: standingReadings(lines.get(row.id) ?? []).map(({ id }) => id),
      }),
    ]),
  );
}

async function readLines(
  db: Database,
  ctx: Context,
  roomIds: string[],
): Promise<Map<string, BookLine[]>> {
  const rows = await db
    .select({
      roomId: readings.roomId,
      id: readings.id,
      kind: readings.kind,
      replaces: sql<string | null>`${readings.body} ->> 'replaces'`,
      readingId: sql<string | null>`${readings.body} ->> 'readingId'`,
    })
    .from(readings)
    .where(and(eq(readings.shopId, ctx.shop.id), inArray(readings.roomId, roomIds)));
  const ofRoom = new Map<string, BookLine[]>();
  for (const { roomId, replaces, readingId, ...line } of rows) {
    const whole = {
      ...line,
      replaces: replaces ?? undefined,
      readingId: readingId ?? undefined,
    };
    const own = ofRoom.get(roomId);
    if (own) own.push(whole);
    else ofRoom.set(roomId, [whole]);
  }
  return ofRoom;
}
