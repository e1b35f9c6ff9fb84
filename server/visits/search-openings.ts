import type { FindOpeningsInput } from '@/lib/contracts/openings';
import type { BookingRules } from '@/lib/contracts/shop-rules';
import {
  driveWhenUnknownMinutes,
  type FoundOpening,
  findOpenings,
  type OpeningsInput,
  type OpeningWeights,
  usualOpeningWeights,
} from '@/lib/schedule';
import { crewsOfEnough, goesOutFor } from '@/lib/schedule/crew-kinds';
import { addDays, type LocalDate } from '@/lib/time/civil';
import { startOfLocalDay } from '@/lib/time/local-moment';
import type { Context } from '@/server/base/context';
import { type CrewPlan, readCrewPlans } from '@/server/shops/crew-plans';
import { estimateMinutes } from './job-facts';
import type { JobRecord } from './job-records';
import { type Drives, estimatedDrives, PlaceList, roadDrives } from './opening-drives';
import { peopleGoing } from './people-going';
import { type Busy, busyOf, readBusy } from './read-busy';

/** A visit may go on for so long after the last day on which it may begin. */
const mostDaysOfVisit = 60;
/** Up to so many places, the roads between all of them are asked for. */
const fewPlaces = 40;
/** Of more, those beside so many of the best times by the line over the ground. */
const bestToRefine = 30;

export type Search = {
  found: FoundOpening[];
  crews: Map<string, CrewPlan>;
  crewCount: number;
  drives: Drives;
};

/** Crews and what is taken: read once, for one search or for many. */
export type SearchGround = { plans: CrewPlan[]; busy: Busy[] };

export async function readSearchGround(
  ctx: Context,
  span: { from: LocalDate; until: LocalDate },
): Promise<SearchGround> {
  const { zone } = ctx.shop;
  const busy = await readBusy(ctx.db, ctx, {
    from: startOfLocalDay(span.from, zone),
    until: startOfLocalDay(addDays(span.until, mostDaysOfVisit), zone),
  });
  return { plans: await readCrewPlans(ctx.db, ctx), busy };
}

/** What it finds is a proposal, which booking alone makes good. */
export async function searchOpenings(
  ctx: Context,
  job: JobRecord,
  asked: FindOpeningsInput & { from: LocalDate; until: LocalDate },
  ground?: SearchGround,
): Promise<Search> {
  const { zone, rules } = ctx.shop;
  const known = ground ?? (await readSearchGround(ctx, asked));
  const able = known.plans.filter(
    (crew) => (asked.crewIds?.includes(crew.id) ?? true) && goesOutFor(crew, asked.kind),
  );
  const plans = crewsOfEnough(able, asked.peopleNeeded ?? (await peopleGoing(ctx, asked)));
  const busy = known.busy.filter(({ visitId }) => visitId !== asked.visitId);

  const list = new PlaceList();
  const { latitude: lat, longitude: lon } = job;
  const site = list.indexOf(lat === null || lon === null ? null : { lat, lon });
  const crews = plans.map((crew) => ({
    id: crew.id,
    name: crew.name,
    calendar: crew.calendar,
    base: list.indexOf(crew.base),
    busy: busyOf(busy, crew, zone).map((piece) => ({ ...piece, place: list.indexOf(piece.place) })),
    workMinutes:
      asked.workMinutes ??
      estimateMinutes(ctx, job, { kind: asked.kind, crewSize: crew.people.length }),
  }));
  const input: Omit<OpeningsInput, 'driveMinutes'> = {
    crews,
    site,
    driveWhenUnknownMinutes,
    from: asked.from,
    until: asked.until,
    now: ctx.now,
    zone,
    windowMinutes: rules.booking.windowMinutes,
    wishes: asked.wishes,
    weights: weightsOf(rules.booking),
  };
  const drives = await drivesFor(ctx, list, input);
  return {
    found: findOpenings({ ...input, driveMinutes: drives.minutes }),
    crews: new Map(plans.map((crew) => [crew.id, crew])),
    crewCount: plans.length,
    drives,
  };
}

/** A shop of before there were weights in the rules ranks as a new shop does. */
function weightsOf(booking: Partial<BookingRules>): OpeningWeights {
  const usual = usualOpeningWeights;
  return {
    driveMinute: booking.weightDriveMinute ?? usual.driveMinute,
    dayWaited: booking.weightDayWaited ?? usual.dayWaited,
    scrapMinute: booking.weightScrapMinute ?? usual.scrapMinute,
    missedWish: booking.weightMissedWish ?? usual.missedWish,
  };
}

async function drivesFor(
  ctx: Context,
  { places }: PlaceList,
  input: Omit<OpeningsInput, 'driveMinutes'>,
): Promise<Drives> {
  const all = places.map((_, index) => index);
  if (all.length <= fewPlaces) return roadDrives(ctx, places, all);
  const estimated = estimatedDrives(ctx, places);
  const likely = findOpenings({ ...input, driveMinutes: estimated.minutes }).slice(0, bestToRefine);
  const wanted = new Set(likely.flatMap((opening) => opening.places));
  wanted.add(input.site);
  return roadDrives(
    ctx,
    places,
    all.filter((index) => wanted.has(index)),
  );
}
