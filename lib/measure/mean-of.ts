import { type Outcome, problem, refused, warning } from '@/lib/problem';
import { type Figure, figure } from './figure';
import { unreadable } from './reading-problems';

/** One of several readings of one thing: its own part of u, and the part its tool gives to all. */
export type Repeat = { id: string; value: number; uOwn: number; uCommon: number; toolId: string };

/**
 * Several readings of one thing in one: u² = u²tool + u²own/n for one tool, tools weighed by 1/u².
 * Edge rule: a pair further apart than both `agreement` (the shop's rule) and twice the u of their
 * difference is reported, and u grows by the half range/√3: a spread is not averaged away.
 * Units: those of the readings (mm or degrees).
 * Example: 2414, 2415, 2415 by one tape (uOwn 0.4, uCommon 0.7) → 2414.67, u = √(0.49 + 0.16/3) = 0.737.
 * Problems: nothing-read, reading-not-a-number, uncertainty-not-known; warning repeats-disagree, about
 * the pair furthest apart.
 * Source: JCGM 100:2008, 4.2.3, 4.3.7, F.1.2.3 (common error).
 */
export function meanOf(readings: Repeat[], agreement: number): Outcome<Figure> {
  if (readings.length === 0) return refused(problem('nothing-read', 'There is no reading yet.'));
  const bad = unreadable(
    readings.map(({ id, value, uOwn, uCommon }) => ({
      id,
      values: [value],
      u: Math.min(uOwn, uCommon) < 0 ? -1 : uOwn + uCommon,
    })),
  );
  if (bad.length > 0) return refused(...bad);
  const { value, u } = weighed(byTool(readings).map(meanOfOneTool));
  const from = readings.map(({ id }) => id);
  const apart = furthestApart(readings);
  if (apart === null || apart.distance <= Math.max(agreement, apart.allowed)) {
    return { value: figure(value, u, from), problems: [] };
  }
  const spread = Math.hypot(u, apart.distance / 2 / Math.sqrt(3));
  const disagree = warning(
    'repeats-disagree',
    'Two readings of the same thing disagree by more than the tool allows. Read it once more.',
    apart.ids,
  );
  return { value: figure(value, spread, from), problems: [disagree] };
}

function byTool(readings: Repeat[]): Repeat[][] {
  const groups = new Map<string, Repeat[]>();
  for (const reading of readings) {
    const group = groups.get(reading.toolId) ?? [];
    group.push(reading);
    groups.set(reading.toolId, group);
  }
  return [...groups.values()];
}

function meanOfOneTool(readings: Repeat[]): { value: number; u: number } {
  const own = weighed(readings.map(({ value, uOwn }) => ({ value, u: uOwn })));
  const common = Math.max(...readings.map(({ uCommon }) => uCommon));
  return { value: own.value, u: Math.hypot(own.u, common) };
}

/** No reading is surer than a nanometre, so that its weight stays a number. */
const LEAST_U = 1e-6;

/** Independent values weighed by 1/u². */
function weighed(values: { value: number; u: number }[]): { value: number; u: number } {
  const weights = values.map(({ u }) => 1 / Math.max(u, LEAST_U) ** 2);
  const total = weights.reduce((sum, weight) => sum + weight, 0);
  const shares = weights.map((weight) => weight / total);
  return {
    value: values.reduce((sum, { value }, at) => sum + value * (shares[at] ?? 0), 0),
    u: Math.hypot(...values.map(({ u }, at) => u * (shares[at] ?? 0))),
  };
}

type Apart = { ids: string[]; distance: number; allowed: number };

/** The pair most in excess of what its two tools allow. */
function furthestApart(readings: Repeat[]): Apart | null {
  let worst: Apart | null = null;
  for (const [at, one] of readings.entries()) {
    for (const other of readings.slice(at + 1)) {
      const distance = Math.abs(one.value - other.value);
      const tools = one.toolId === other.toolId ? 0 : Math.hypot(one.uCommon, other.uCommon);
      const allowed = 2 * Math.hypot(one.uOwn, other.uOwn, tools);
      if (worst === null || distance - allowed > worst.distance - worst.allowed) {
        worst = { ids: [one.id, other.id], distance, allowed };
      }
    }
  }
  return worst;
}
