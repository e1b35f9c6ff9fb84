import { inArray } from 'drizzle-orm';
import { jobs } from '@/db/schema';
import { noWishes } from '@/lib/contracts/openings';
import type { SlipInput, SlipMove, SlipPreview } from '@/lib/contracts/slips';
import type { VisitView } from '@/lib/contracts/visits';
import { gateProblems, readinessFor, type VisitKind } from '@/lib/schedule';
import { slipProposal, slippedReadyDay, slipWords } from '@/lib/schedule/slip';
import { addDays, type LocalDate } from '@/lib/time/civil';
import { formatLocalDayShort } from '@/lib/time/format-civil';
import { localDate, toLocal } from '@/lib/time/local-moment';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { notFound } from '@/server/base/problem-response';
import { bookingDays } from '@/server/shops/booking-days';
import { factsOf } from '@/server/visits/job-facts';
import { type JobRecord, readJobRecords } from '@/server/visits/job-records';
import { openingView } from '@/server/visits/opening-view';
import {
  readSearchGround,
  type SearchGround,
  searchOpenings,
} from '@/server/visits/search-openings';
import { readMovableVisits } from './read-movable-visits';

/** In the order in which one waits for the other. */
const chain: VisitKind[] = ['delivery', 'install', 'worktop-template', 'return'];
const horizonDays = 90;

/** What a delay of the shop moves, and where each visit could go. Nothing is written, nobody is told. */
export async function previewSlip(ctx: PersonContext, input: SlipInput): Promise<SlipPreview> {
  mustBeAllowed(ctx, 'visits:book');
  const jobIds = [...new Set(input.jobIds)];
  const records = await readJobRecords(ctx.db, ctx, inArray(jobs.id, jobIds));
  if (records.length < jobIds.length) throw notFound('job');
  const visits = await readMovableVisits(ctx, jobIds);
  const today = localDate(ctx.now, ctx.shop.zone);
  const ground = await readSearchGround(ctx, { from: today, until: addDays(today, horizonDays) });
  const preview: SlipPreview = { jobs: [], moves: [], staying: 0, customersToTell: 0 };
  const customers = new Set<string>();
  for (const record of records) {
    const ready = slippedReadyDay(factsOf(ctx, record), input.days, {
      rules: bookingDays(ctx),
      today,
    });
    if (!ready) continue;
    preview.jobs.push({
      jobId: record.id,
      jobNumber: record.number,
      customerName: record.customerName,
      readyOn: ready.becomes,
      readyWords: dayWords(ctx, ready.becomes),
      wasReadyWords: dayWords(ctx, ready.was),
    });
    const late = { ...record, readyOn: ready.becomes };
    const own = visits.filter(({ jobId }) => jobId === record.id);
    const moves = await movesOf(ctx, late, own, ground);
    preview.moves.push(...moves);
    preview.staying += own.length - moves.length;
    if (moves.length > 0) customers.add(record.customerId);
  }
  return { ...preview, customersToTell: customers.size };
}

/** One visit after the other: a template waits for where the install goes. */
async function movesOf(
  ctx: PersonContext,
  late: JobRecord,
  visits: VisitView[],
  ground: SearchGround,
): Promise<SlipMove[]> {
  const moves: SlipMove[] = [];
  let job = late;
  const inChain = chain.flatMap((kind) => visits.filter((visit) => visit.kind === kind));
  for (const visit of inChain) {
    const stands = toLocal(new Date(visit.startsAt), ctx.shop.zone);
    const broken = gateProblems(gateInput(ctx, job, visit.kind), stands.date);
    if (broken.length === 0) continue;
    const { move, endsAt } = await moveOf(ctx, job, visit, ground);
    moves.push({ ...move, brokenGates: broken.map(({ message }) => message) });
    if (!endsAt) continue;
    job = {
      ...job,
      visits: job.visits.map((other) => (other.id === visit.id ? { ...other, endsAt } : other)),
    };
  }
  return moves;
}

async function moveOf(
  ctx: PersonContext,
  job: JobRecord,
  visit: VisitView,
  ground: SearchGround,
): Promise<{ move: SlipMove; endsAt: Date | null }> {
  const { zone } = ctx.shop;
  const was = toLocal(new Date(visit.startsAt), zone);
  const stood = { crewId: visit.crewId, date: was.date, time: was.time };
  const move: SlipMove = {
    visitId: visit.id,
    version: visit.version,
    jobId: visit.jobId,
    jobNumber: visit.jobNumber,
    customerName: visit.customerName,
    kind: visit.kind,
    crewName: visit.crewName,
    dayWords: visit.dayWords,
    windowWords: visit.windowWords,
    brokenGates: [],
    proposal: null,
    whyNone: '',
  };
  const { from } = readinessFor(gateInput(ctx, job, visit.kind));
  if (!from) {
    const whyNone = 'A gate is not passed and has no date. Settle it, or call the visit off.';
    return { move: { ...move, whyNone }, endsAt: null };
  }
  const wishes = { ...noWishes, notBefore: was.time, notAfter: was.time };
  const search = await searchOpenings(
    ctx,
    job,
    {
      jobId: job.id,
      kind: visit.kind,
      visitId: visit.id,
      workMinutes: visit.workMinutes,
      from,
      until: addDays(from, horizonDays),
      isGateOverridden: false,
      wishes,
      limit: 1,
    },
    ground,
  );
  const found = slipProposal(stood, search.found, zone);
  if (!found) {
    const whyNone = `No crew is free within ${horizonDays} days of ${dayWords(ctx, from)}.`;
    return { move: { ...move, whyNone }, endsAt: null };
  }
  const view = openingView(ctx, found, search, wishes);
  const { crewId, crewName, date, time } = view;
  takeGround(ground, visit, found, search.crews.get(crewId)?.people.map(({ id }) => id) ?? []);
  const proposal = {
    crewId,
    crewName,
    date,
    time,
    dayWords: view.dayWords,
    windowWords: view.windowWords,
    why: slipWords(stood, { crewId, date, time }),
  };
  return { move: { ...move, proposal }, endsAt: new Date(view.endsAt) };
}

/** The old time is free and the proposed one taken, for the visits that are placed after this one. */
function takeGround(
  ground: SearchGround,
  visit: VisitView,
  found: { crewId: string; pieces: { startsAt: Date; endsAt: Date }[] },
  personIds: string[],
): void {
  const old = ground.busy.find(({ visitId }) => visitId === visit.id);
  const kept = ground.busy.filter(({ visitId }) => visitId !== visit.id);
  const taken = found.pieces.map((piece, index) => ({
    ...piece,
    pieceId: `${visit.id} ${index}`,
    visitId: visit.id,
    crewId: found.crewId,
    personIds,
    place: old?.place ?? null,
    label: old?.label ?? visit.customerName,
  }));
  ground.busy = [...kept, ...taken];
}

function gateInput(ctx: PersonContext, job: JobRecord, kind: VisitKind) {
  return {
    kind,
    facts: factsOf(ctx, job),
    rules: bookingDays(ctx),
    today: localDate(ctx.now, ctx.shop.zone),
    locale: { language: 'en', region: ctx.shop.region } as const,
  };
}

function dayWords(ctx: PersonContext, date: LocalDate): string {
  return formatLocalDayShort(date, { language: 'en', region: ctx.shop.region });
}
