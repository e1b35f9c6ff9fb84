import { and, eq, inArray } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { readings, rooms } from '@/db/schema';
import type { Reading } from '@/lib/contracts/readings';
import {
  parseReading,
  type RecordReadingsAnswer,
  type RecordReadingsInput,
} from '@/lib/contracts/rooms';
import { sortedJson } from '@/lib/sync/sorted-json';
import { writeAudit } from '@/server/base/audit';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';

/**
 * Takes what a phone sends, in its order. Sent twice, a reading changes nothing and is accepted again; one
 * that is not understood is parked alone and holds up no other.
 */
export async function recordReadings(
  ctx: PersonContext,
  input: RecordReadingsInput,
): Promise<RecordReadingsAnswer> {
  mustBeAllowed(ctx, 'walls:measure');
  const { understood, parked } = sortOut(input);
  return ctx.db.transaction(async (tx) => {
    const [room] = await tx
      .select({ jobId: rooms.jobId, name: rooms.name })
      .from(rooms)
      .where(and(eq(rooms.shopId, ctx.shop.id), eq(rooms.id, input.roomId)));
    if (!room) throw notFound('room');
    const added = await append(tx, ctx, understood);
    const kept = await readKept(tx, ctx, input.roomId, understood);
    const accepted: string[] = [];
    for (const reading of understood) {
      if (kept.get(reading.id) === sortedJson(reading)) accepted.push(reading.id);
      else parked.push({ id: reading.id, message: idTaken });
    }
    if (added > 0) {
      await writeAudit(tx, ctx, {
        verb: 'record-readings',
        subjectKind: 'room',
        subjectId: input.roomId,
        jobId: room.jobId,
        summary: `Took ${added} reading${added === 1 ? '' : 's'} in ${room.name}`,
      });
    }
    return { accepted, parked };
  });
}

function sortOut(input: RecordReadingsInput) {
  const understood: Reading[] = [];
  const parked: RecordReadingsAnswer['parked'] = [];
  for (const value of input.readings) {
    const parsed = parseReading(value);
    if (!parsed.success) {
      const [issue] = parsed.error.issues;
      const where = issue && issue.path.length > 0 ? `${issue.path.join('.')}: ` : '';
      parked.push({ id: idOf(value), message: `${where}${issue?.message ?? 'Not understood.'}` });
    } else if (parsed.data.roomId !== input.roomId) {
      parked.push({ id: parsed.data.id, message: 'This reading names another room.' });
    } else {
      understood.push(parsed.data);
    }
  }
  return { understood, parked };
}

/** How many were new. */
async function append(tx: Transaction, ctx: PersonContext, list: Reading[]): Promise<number> {
  if (list.length === 0) return 0;
  const added = await tx
    .insert(readings)
    .values(
      list.map((body) => ({
        shopId: ctx.shop.id,
        id: body.id,
        roomId: body.roomId,
        kind: body.kind,
        body,
        takenAt: new Date(body.takenAt),
        takenBy: ctx.actor.personId,
        receivedAt: ctx.now,
      })),
    )
    .onConflictDoNothing({ target: readings.id })
    .returning({ id: readings.id });
  return added.length;
}

/** What the book now holds under these ids; ids of other rooms and shops are not there. */
async function readKept(
  tx: Transaction,
  ctx: PersonContext,
  roomId: string,
  list: Reading[],
): Promise<Map<string, string>> {
  const ids = list.map(({ id }) => id);
  const rows = await tx
    .select({ id: readings.id, body: readings.body })
    .from(readings)
    .where(
      and(eq(readings.shopId, ctx.shop.id), eq(readings.roomId, roomId), inArray(readings.id, ids)),
    );
  return new Map(rows.map(({ id, body }) => [id, sortedJson(body)]));
}

function idOf(value: unknown): string {
  const id = value && typeof value === 'object' && 'id' in value ? value.id : null;
  return typeof id === 'string' ? id : '';
}

const idTaken = 'Another reading has this id already. It was not changed; read it again.';
