/** What the records of a job mean for the order of work. */
import { type Estimate, estimateVisit, type JobFacts, type VisitKind } from '@/lib/schedule';
import { localDate } from '@/lib/time/local-moment';
import type { Context } from '@/server/base/context';
import type { JobRecord } from './job-records';

/** A visit that is still to come or under way, or was carried out; missed and called off ones leave the need. */
const notStanding = new Set(['missed', 'called-off']);
const usualCrewSize = 2;

export function factsOf(ctx: Context, job: JobRecord): JobFacts {
  const { zone } = ctx.shop;
  const lastDayOf = (visit: { endsAt: Date }) => localDate(new Date(+visit.endsAt - 1), zone);
  const newest = (kind: VisitKind) => standing(job, kind).at(-1);
  const delivery = newest('delivery');
  const install = newest('install');
  return {
    wallsReady: job.wallsReady,
    siteReadyOn: job.siteReadyOn,
    // Somebody who can be told when we come opens the door; else the way in must be known.
    accessGiven: job.wayIn !== '' || job.phone !== '' || job.email !== '',
    notReady: job.notReady,
    measuredOn: measuredOn(ctx, job),
    release: releaseOf(ctx, job),
    readyOn: job.readyOn,
    floorAgreed: job.floorAgreed,
    deliveryOn: delivery ? lastDayOf(delivery) : null,
    install: install ? { lastDay: lastDayOf(install), isDone: install.status === 'done' } : null,
    basesSet: install?.status === 'done',
  };
}

/** The visits of a kind that stand, in the order of their ends. */
export function standing(job: JobRecord, kind: VisitKind): JobRecord['visits'] {
  return job.visits.filter((visit) => visit.kind === kind && !notStanding.has(visit.status));
}

type ToEstimate = { kind: VisitKind; crewSize?: number };

/** Minutes on site by the shop's own figures, for a crew of this many people. */
export function estimateMinutes(ctx: Context, job: JobRecord, visit: ToEstimate): number {
  return estimate(job, visit, ctx.shop.rules.booking).minutes;
}

/**
 * The same taken apart: minutes of one person beside the units or rooms, and how many of those there are, as the
 * shop's minutes for each multiply.
 */
export function estimateTakenApart(job: JobRecord, visit: ToEstimate) {
  const of = (minutes: number) =>
    estimate(job, visit, { measureMinutesPerRoom: minutes, installMinutesPerUnit: minutes })
      .personMinutes;
  return { fixedPersonMinutes: of(0), count: of(1) - of(0) };
}

function estimate(
  job: JobRecord,
  visit: ToEstimate,
  shop: { measureMinutesPerRoom: number; installMinutesPerUnit: number },
): Estimate {
  const { measureMinutesPerRoom, installMinutesPerUnit } = shop;
  const units = Object.fromEntries(job.units.map(({ kind, count }) => [kind, count]));
  const roomCount = Math.max(job.rooms.length, job.roomCount);
  const { value } = estimateVisit({
    kind: visit.kind,
    crewSize: Math.max(1, visit.crewSize ?? usualCrewSize),
    rooms: Array.from({ length: roomCount }, () => 'kitchen' as const),
    units,
    unitsNotLaidOut: job.units.length > 0 ? 0 : job.unitCount,
    fitExtraMinutes: visit.kind === 'install' ? extraInstallMinutes(job) : 0,
    stairFloors: job.hasLift ? 0 : Math.abs(job.floorsUp),
    ownMinutes: {
      measureKitchen: measureMinutesPerRoom,
      anyUnit: installMinutesPerUnit,
      base: installMinutesPerUnit,
      wall: installMinutesPerUnit,
    },
  });
  if (!value) throw new Error(`the counts of job ${job.id} give no estimate`);
  return value;
}

const extraInstallMinutes = ({ rooms }: JobRecord) =>
  sum(rooms.map(({ release }) => release?.extraInstallMinutes ?? 0));

/** Handed in when every room of the job is. */
function measuredOn(ctx: Context, { rooms }: JobRecord): string | null {
  const last = latest(rooms.map(({ submittedAt }) => submittedAt));
  return last && localDate(last, ctx.shop.zone);
}

/** Released when every room that has runs is; the youngest revision speaks for the job. */
function releaseOf(ctx: Context, { rooms }: JobRecord): JobFacts['release'] {
  const toBuild = rooms.filter(({ hasRuns }) => hasRuns).map(({ release }) => release);
  const last = latest(toBuild.map((release) => release?.releasedAt ?? null));
  const youngest = toBuild.find((release) => release?.releasedAt === last);
  if (!last || !youngest) return null;
  return {
    revision: youngest.revision,
    releasedOn: localDate(last, ctx.shop.zone),
    isSuperseded: toBuild.some((release) => release?.isSuperseded),
  };
}

/** The latest of all; null when one is missing or there are none. */
function latest(instants: (Date | null)[]): Date | null {
  if (instants.includes(null)) return null;
  return instants.toSorted((a, b) => Number(a) - Number(b)).at(-1) ?? null;
}

const sum = (numbers: number[]): number => numbers.reduce((total, number) => total + number, 0);
