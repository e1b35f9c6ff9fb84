import { and, asc, eq, gt, inArray, lt, ne, or } from 'drizzle-orm';
import { crews, customers, jobs, people, visitPiecePeople, visitPieces, visits } from '@/db/schema';
import type { Piece, VisitKind } from '@/lib/schedule';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { formatDayShort, formatWindowShort } from '@/lib/time/format-instant';
import type { Context } from '@/server/base/context';
import { translateRefusals } from '@/server/base/database-refusal';
import type { RefusalDetail } from '@/server/base/problem-response';

/** What was being booked, known once it was planned. */
export type Attempt = { visitId: string; crewId: string; personIds: string[]; pieces: Piece[] };

/** Runs a booking; when the database refuses an overlap, says who is taken, when, and by which visit. */
export function translateTakenTime<T>(
  ctx: Context,
  attempt: () => Attempt | null,
  write: () => Promise<T>,
): Promise<T> {
  const words = (find: typeof findTakenCrew) => async () => {
    const tried = attempt();
    return takenRefusal(ctx, tried && (await find(ctx, tried)));
  };
  return translateRefusals(
    {
      visit_pieces_one_crew_one_place: words(findTakenCrew),
      visit_piece_people_one_place: words(findTakenPerson),
    },
    write,
  );
}

type Taken = {
  who: string;
  visitId: string;
  kind: VisitKind;
  jobNumber: number;
  customerName: string;
  crewName: string;
  startsAt: Date;
  endsAt: Date;
};

async function findTakenCrew(ctx: Context, attempt: Attempt): Promise<Taken | undefined> {
  const [found] = await ctx.db
    .select({ who: crews.name, ...takenFields(visitPieces) })
    .from(visitPieces)
    .innerJoin(visits, eq(visits.id, visitPieces.visitId))
    .innerJoin(crews, eq(crews.id, visits.crewId))
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .where(
      and(
        eq(visitPieces.shopId, ctx.shop.id),
        eq(visitPieces.crewId, attempt.crewId),
        ne(visitPieces.visitId, attempt.visitId),
        overlapping(visitPieces, attempt.pieces),
      ),
    )
    .orderBy(asc(visitPieces.startsAt))
    .limit(1);
  return found;
}

async function findTakenPerson(ctx: Context, attempt: Attempt): Promise<Taken | undefined> {
  const [found] = await ctx.db
    .select({ who: people.name, ...takenFields(visitPiecePeople) })
    .from(visitPiecePeople)
    .innerJoin(visitPieces, eq(visitPieces.id, visitPiecePeople.pieceId))
    .innerJoin(people, eq(people.id, visitPiecePeople.personId))
    .innerJoin(visits, eq(visits.id, visitPieces.visitId))
    .innerJoin(crews, eq(crews.id, visits.crewId))
    .innerJoin(jobs, eq(jobs.id, visits.jobId))
    .innerJoin(customers, eq(customers.id, jobs.customerId))
    .where(
      and(
        eq(visitPiecePeople.shopId, ctx.shop.id),
        inArray(visitPiecePeople.personId, attempt.personIds),
        ne(visitPieces.visitId, attempt.visitId),
        overlapping(visitPiecePeople, attempt.pieces),
      ),
    )
    .orderBy(asc(visitPiecePeople.startsAt))
    .limit(1);
  return found;
}

type Busy = typeof visitPieces | typeof visitPiecePeople;

function takenFields(busy: Busy) {
  return {
    visitId: visits.id,
    kind: visits.kind,
    jobNumber: jobs.number,
    customerName: customers.name,
    crewName: crews.name,
    startsAt: busy.startsAt,
    endsAt: busy.endsAt,
  };
}

function overlapping(busy: Busy, pieces: Piece[]) {
  return or(
    ...pieces.map(({ startsAt, endsAt }) =>
      and(lt(busy.startsAt, endsAt), gt(busy.endsAt, startsAt)),
    ),
  );
}

function takenRefusal(ctx: Context, taken: Taken | null | undefined): RefusalDetail {
  const refusal = { status: 409, code: 'crew-already-booked' } as const;
  if (!taken) {
    const message =
      'Nothing was changed. Somebody took this time and left it again: try once more.';
    return { ...refusal, message };
  }
  const { who, crewName, startsAt, endsAt } = taken;
  const togetherWith = who === crewName ? '' : ` with ${crewName}`;
  const visit = `${visitKindWords[taken.kind]} for ${taken.customerName}, job ${taken.jobNumber}`;
  return {
    ...refusal,
    message: `Nothing was changed. ${who} is taken ${timeWords(ctx, startsAt, endsAt)}${togetherWith}: ${visit}.`,
    current: {
      visitId: taken.visitId,
      who,
      crewName,
      startsAt: startsAt.toISOString(),
      endsAt: endsAt.toISOString(),
    },
  };
}

function timeWords(ctx: Context, from: Date, until: Date): string {
  const { zone, region } = ctx.shop;
  const locale = { language: 'en', region } as const;
  const times = formatWindowShort({ from, until }, zone, locale);
  return `${formatDayShort(from, zone, locale)}, ${times}`;
}
