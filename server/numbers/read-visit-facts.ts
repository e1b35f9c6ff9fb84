import { and, asc, eq, gte, inArray, lte } from 'drizzle-orm';
import { crews, jobs, visitPauses, visitPieces, visits } from '@/db/schema';
import type { Span, VisitFact } from '@/lib/numbers/facts';
import type { PersonContext } from '@/server/base/context';

const counted = ['booked', 'confirmed', 'on-the-way', 'on-site', 'done', 'missed'] as const;

/** Visits that came due in the period, with their daily pieces and their pauses. */
export async function readVisitFacts(
  ctx: PersonContext,
  period: { from: Date; until: Date },
): Promise<VisitFact[]> {
  const shopId = ctx.shop.id;
  const rows = await ctx.db
    .select({
      visitId: visits.id,
      jobId: visits.jobId,
      jobNumber: jobs.number,
      kind: visits.kind,
      crewName: crews.name,
      status: visits.status,
      startsAt: visits.startsAt,
      windowStartsAt: visits.windowStartsAt,
      windowEndsAt: visits.windowEndsAt,
      confirmedAt: visits.confirmedAt,
      arrivedAt: visits.arrivedAt,
      leftAt: visits.leftAt,
      workMinutes: visits.workMinutes,
    })
    .from(visits)
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(crews, eq(crews.id, visits.crewId))
    .where(
      and(
        eq(visits.shopId, shopId),
        inArray(visits.status, [...counted]),
        gte(visits.startsAt, period.from),
        lte(visits.startsAt, period.until),
      ),
    )
    .orderBy(asc(visits.startsAt), asc(visits.id));
  const ids = rows.map(({ visitId }) => visitId);
  const pieces = await readPieces(ctx, ids);
  const pauses = await readPauses(ctx, ids);
  return rows.map((row) => ({
    ...row,
    status: row.status as VisitFact['status'],
    pieces: pieces.get(row.visitId) ?? [],
    pauses: pauses.get(row.visitId) ?? [],
  }));
}

async function readPieces(ctx: PersonContext, ids: string[]): Promise<Map<string, Span[]>> {
  const rows = await ctx.db
    .select({
      visitId: visitPieces.visitId,
      startsAt: visitPieces.startsAt,
      endsAt: visitPieces.endsAt,
    })
    .from(visitPieces)
    .where(and(eq(visitPieces.shopId, ctx.shop.id), inArray(visitPieces.visitId, ids)));
  return gathered(rows);
}

/** A pause lasts until work goes on; one that nobody ended lasts until the next, or until they left. */
async function readPauses(ctx: PersonContext, ids: string[]): Promise<Map<string, Span[]>> {
  const rows = await ctx.db
    .select({ visitId: visitPauses.visitId, what: visitPauses.what, at: visitPauses.at })
    .from(visitPauses)
    .where(and(eq(visitPauses.shopId, ctx.shop.id), inArray(visitPauses.visitId, ids)))
    .orderBy(asc(visitPauses.visitId), asc(visitPauses.at));
  const farAhead = new Date(8.64e15);
  return gathered(
    rows.flatMap((row, place) => {
      if (row.what !== 'pause') return [];
      const next = rows[place + 1];
      const endsAt = next?.visitId === row.visitId ? next.at : farAhead;
      return [{ visitId: row.visitId, startsAt: row.at, endsAt }];
    }),
  );
}

function gathered(rows: ({ visitId: string } & Span)[]): Map<string, Span[]> {
  const byVisit = new Map<string, Span[]>();
  for (const { visitId, ...span } of rows) {
    byVisit.set(visitId, [...(byVisit.get(visitId) ?? []), span]);
  }
  return byVisit;
}
