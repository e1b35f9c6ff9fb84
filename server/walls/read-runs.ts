import { and, asc, eq, inArray } from 'drizzle-orm';
import type { Database } from '@/db/database';
import { runs, units } from '@/db/schema';
import type { Run } from '@/lib/contracts/runs';
import type { Context } from '@/server/base/context';

/** The runs of these rooms with their units, left to right; a room without any is not in the answer. */
export async function readRuns(
  db: Database,
  ctx: Context,
  roomIds: string[],
): Promise<Map<string, Run[]>> {
  const ofRooms = and(eq(runs.shopId, ctx.shop.id), inArray(runs.roomId, roomIds));
  const runRows = await db
    .select({
      roomId: runs.roomId,
      id: runs.id,
      wallId: runs.wallId,
      name: runs.name,
      body: runs.body,
    })
    .from(runs)
    .where(ofRooms)
    .orderBy(asc(runs.position));
  const unitRows = await db
    .select({
      runId: units.runId,
      id: units.id,
      name: units.name,
      kind: units.kind,
      widthMm: units.widthMm,
      alterable: units.alterable,
      armMm: units.armMm,
      needHeightMm: units.needHeightMm,
    })
    .from(units)
    .innerJoin(runs, eq(runs.id, units.runId))
    .where(ofRooms)
    .orderBy(asc(units.position));
  const ofRun = new Map<string, Run['units']>();
  for (const { runId, armMm, needHeightMm, ...unit } of unitRows) {
    const whole = {
      ...unit,
      ...(armMm === null ? {} : { armMm }),
      ...(needHeightMm === null ? {} : { needHeightMm }),
    };
    ofRun.set(runId, [...(ofRun.get(runId) ?? []), whole]);
  }
  const ofRoom = new Map<string, Run[]>();
  for (const { roomId, body, ...run } of runRows) {
    const whole = { ...run, ...body, units: ofRun.get(run.id) ?? [] };
    ofRoom.set(roomId, [...(ofRoom.get(roomId) ?? []), whole]);
  }
  return ofRoom;
}
