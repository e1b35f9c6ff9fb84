/** How long a visit takes, from what is to be done there. */
import type { UnitKind } from '@/lib/contracts/runs';
import type { Outcome, Problem } from '@/lib/problem';
import { type DurationKey, durationTable } from './duration-table';
import type { VisitKind } from './visit-kind';

export type VisitWork = {
  kind: VisitKind;
  /** People who share the work on site. */
  crewSize: number;
  /** For measures: one entry a room. */
  rooms?: readonly ('kitchen' | 'one-wall')[];
  /** Units of the runs, by kind. */
  units?: Readonly<Partial<Record<UnitKind, number>>>;
  /** Units known only by their number, because no run is laid out yet. */
  unitsNotLaidOut?: number;
  /** Pieces, or metres for crown, light rail and kick. */
  items?: Readonly<Partial<Record<CountedItem, number>>>;
  /** Floors that every unit is carried up or down by stairs. */
  stairFloors?: number;
  snags?: number;
  /** Minutes of one person that the walls add, by the fit: tapers, deep scribes, a sloping floor. */
  fitExtraMinutes?: number;
  /** The shop's own minutes, in place of the table's. */
  ownMinutes?: Readonly<Partial<Record<DurationKey, number>>>;
};

export type CountedItem =
  | 'filler'
  | 'panel'
  | 'refrigeratorSurround'
  | 'island'
  | 'crown'
  | 'lightRail'
  | 'kick'
  | 'front'
  | 'stripOut';

export type EstimatePart = { item: string; count: number; personMinutes: number; basis: string };

export type Estimate = {
  /** Time on site by the clock, rounded up to a quarter of an hour. */
  minutes: number;
  /** The same with the table's lows and highs. */
  lowMinutes: number;
  highMinutes: number;
  personMinutes: number;
  parts: EstimatePart[];
};

/** Appliances and openings are places that the run leaves; another trade fills them. */
const rowOfUnit: Record<UnitKind, DurationKey | null> = {
  base: 'base',
  drawers: 'base',
  sink: 'cornerOrSink',
  corner: 'cornerOrSink',
  wall: 'wall',
  tall: 'tall',
  panel: 'panel',
  dishwasher: null,
  range: null,
  refrigerator: null,
  hood: null,
  open: null,
};

/** Two people do not read one wall in half the time; they do set boxes in half. */
const shared: ReadonlySet<VisitKind> = new Set<VisitKind>(['install', 'delivery', 'return']);

const BOOKING_STEP_MINUTES = 15;
const MOST_OF_ANYTHING = 10_000;

type Count = { key: DurationKey; count: number };

/**
 * Adds up the table's minutes for a visit and divides them among the crew where work can be shared.
 * Example: an install of 6 base, 1 sink, 1 corner, 6 wall and 1 tall unit with 4 fillers, 2 panels and 7 m of
 * kick, two people: 1455 person-minutes, 735 minutes on site (12 1/4 h), 405 to 1035 by the lows and highs.
 * Problems: count-out-of-range (error: nothing is guessed from a negative or absurd number);
 * no-units (warning: an install of nothing is only set-up and cleaning).
 */
export function estimateVisit(work: VisitWork): Outcome<Estimate> {
  const counts = gathered(countsOf(work));
  const extra = work.fitExtraMinutes ?? 0;
  const numbers = [
    ...counts.map(({ count }) => count),
    ...Object.values(work.ownMinutes ?? {}),
    extra,
  ];
  const isCrew = Number.isInteger(work.crewSize) && work.crewSize >= 1;
  if (!isCrew || numbers.some((number) => !(number >= 0 && number <= MOST_OF_ANYTHING))) {
    return { value: null, problems: [outOfRange] };
  }
  const people = shared.has(work.kind) ? work.crewSize : 1;
  const parts = counts.map(({ key, count }) => partOf(key, count, work));
  if (extra > 0) {
    parts.push({ item: 'Walls out of true', count: 1, personMinutes: extra, basis: 'the fit' });
  }
  const personMinutes = sum(parts.map((part) => part.personMinutes));
  const limits = (limit: 'low' | 'high') =>
    sum(counts.map(({ key, count }) => durationTable[key][limit] * count)) + extra;
  return {
    value: {
      minutes: toStep(personMinutes / people),
      lowMinutes: toStep(Math.min(limits('low'), personMinutes) / people),
      highMinutes: toStep(Math.max(limits('high'), personMinutes) / people),
      personMinutes,
      parts,
    },
    problems: work.kind === 'install' && unitCount(work) === 0 ? [noUnits] : [],
  };
}

/** One count a row of the table, in the order in which the rows first come; none for nothing. */
function gathered(counts: Count[]): Count[] {
  const byKey = new Map<DurationKey, number>();
  for (const { key, count } of counts) byKey.set(key, (byKey.get(key) ?? 0) + count);
  return [...byKey].filter(([, count]) => count !== 0).map(([key, count]) => ({ key, count }));
}

function countsOf(work: VisitWork): Count[] {
  const rooms = work.rooms ?? ['kitchen'];
  switch (work.kind) {
    case 'site-measure':
      return rooms.map((room) => ({
        key: room === 'kitchen' ? 'measureKitchen' : 'measureOneWall',
        count: 1,
      }));
    case 'check-measure':
      return [{ key: 'checkMeasure', count: rooms.length }];
    case 'worktop-template':
      return [{ key: 'template', count: 1 }];
    case 'delivery':
      return [
        { key: 'deliveryCheck', count: 1 },
        { key: 'unload', count: unitCount(work) },
        { key: 'carryUp', count: unitCount(work) * (work.stairFloors ?? 0) },
      ];
    case 'return':
      return [
        { key: 'returnVisit', count: 1 },
        { key: 'snag', count: work.snags ?? 0 },
      ];
    case 'install':
      return installCounts(work);
  }
}

function installCounts(work: VisitWork): Count[] {
  const units = Object.entries(work.units ?? {}).flatMap(([kind, count]) => {
    const key = rowOfUnit[kind as UnitKind];
    return key ? [{ key, count }] : [];
  });
  const items = Object.entries(work.items ?? {}).map(([key, count]) => ({
    key: key as CountedItem,
    count,
  }));
  return [
    { key: 'setUp', count: 1 },
    ...units,
    { key: 'anyUnit', count: work.unitsNotLaidOut ?? 0 },
    ...items,
    { key: 'carryUp', count: unitCount(work) * (work.stairFloors ?? 0) },
    { key: 'clean', count: 1 },
  ];
}

/** Boxes and panels to carry and set; appliances are not counted. */
function unitCount(work: VisitWork): number {
  const laidOut = Object.entries(work.units ?? {}).map(([kind, count]) =>
    rowOfUnit[kind as UnitKind] ? count : 0,
  );
  return sum(laidOut) + (work.unitsNotLaidOut ?? 0);
}

function partOf(key: DurationKey, count: number, work: VisitWork): EstimatePart {
  const row = durationTable[key];
  const own = work.ownMinutes?.[key];
  return {
    item: row.item,
    count,
    personMinutes: count * (own ?? row.minutes),
    basis: own === undefined ? row.basis : "the shop's own",
  };
}

const toStep = (minutes: number): number =>
  Math.ceil(minutes / BOOKING_STEP_MINUTES - 1e-9) * BOOKING_STEP_MINUTES;

const sum = (numbers: number[]): number => numbers.reduce((total, number) => total + number, 0);

const outOfRange: Problem = {
  code: 'count-out-of-range',
  message: 'A count of units, items, people or minutes is negative, absurd or not a number.',
  about: [],
  severity: 'error',
};

const noUnits: Problem = {
  code: 'no-units',
  message: 'No units are counted: the time is for setting up and cleaning only.',
  about: [],
  severity: 'warning',
};
