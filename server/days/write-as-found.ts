import { and, eq } from 'drizzle-orm';
import type { Transaction } from '@/db/database';
import { releases, rooms, siteChecks } from '@/db/schema';
import type { DayEventOf } from '@/lib/contracts/day-events';
import { asFound } from '@/lib/days/as-found';
import { writeAudit } from '@/server/base/audit';
import type { PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { mustBeOwnRow } from './mark-once';
import type { OwnVisit } from './own-visit';

/** Readings as found, held against the release here as they were on the phone: the same engine says it. */
export async function writeAsFound(
  tx: Transaction,
  ctx: PersonContext,
  { event, visit, at }: { event: DayEventOf<'as-found'>; visit: OwnVisit; at: Date },
): Promise<void> {
  const [release] = await tx
    .select({
      roomId: releases.roomId,
      roomName: rooms.name,
      revision: releases.revision,
      wallBook: releases.wallBook,
      runs: releases.runs,
      rules: releases.rules,
      fit: releases.fit,
    })
    .from(releases)
    .innerJoin(rooms, eq(rooms.id, releases.roomId))
    .where(
      and(
        eq(releases.shopId, ctx.shop.id),
        eq(releases.id, event.releaseId),
        eq(rooms.jobId, visit.jobId),
      ),
    );
  if (!release) throw notFound('sheet');
  const { roomId, roomName, revision } = release;
  const readings = event.readings.map((reading) => ({ ...reading, roomId }));
  const { disagreements, changes } = asFound(release, readings);
  const [added] = await tx
    .insert(siteChecks)
    .values({
      shopId: ctx.shop.id,
      id: event.id,
      visitId: visit.id,
      roomId,
      releaseId: event.releaseId,
      readings,
      disagreements,
      changes,
      at,
      byPersonId: ctx.actor.personId,
    })
    .onConflictDoNothing({ target: siteChecks.id })
    .returning({ id: siteChecks.id });
  if (!added) {
    const [known] = await tx
      .select({ visitId: siteChecks.visitId })
      .from(siteChecks)
      .where(and(eq(siteChecks.shopId, ctx.shop.id), eq(siteChecks.id, event.id)));
    return mustBeOwnRow(known, visit.id);
  }
  await writeAudit(tx, ctx, {
    verb: 'as-found',
    subjectKind: 'room',
    subjectId: roomId,
    jobId: visit.jobId,
    summary:
      disagreements.length === 0
        ? `${roomName} as found: it is as on revision ${revision}`
        : `${roomName} is not as on revision ${revision}: ${disagreements.join('; ')}`,
    detail: { disagreements, changes },
  });
}
