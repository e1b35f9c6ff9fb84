import { type Fleet, type Routes, settleRoute } from './routes-state';
import type { Random } from './seeded-random';

/** Stops taken out at once, on average. */
const MEAN_TAKEN_OUT = 10;
const LONGEST_STRING = 10;
/** How often a string keeps some stops in its middle, and how often that middle stops growing. */
const SPLIT_SHARE = 0.5;
const MIDDLE_ENDS_SHARE = 0.01;

/**
 * Takes strings of neighbouring stops out of routes that pass near each other, so that they can be put back
 * differently; tells which crews' routes it will change before it does.
 * Source: J. Christiaens and G. Vanden Berghe, Slack Induction by String Removals for Vehicle Routing Problems,
 * Transportation Science 54 (2020) 417–433, with the parameters given there.
 */
export function takeOut(
  fleet: Fleet,
  routes: Routes,
  search: { random: Random; near: readonly Int32Array[]; onChange: (crew: number) => void },
): void {
  const { random, near, onChange } = search;
  const used = routes.order.filter((order) => order.length > 0);
  const placed = fleet.stopCount - routes.unplaced.length;
  if (used.length === 0) return;
  const longest = Math.min(LONGEST_STRING, placed / used.length);
  const mostStrings = (4 * MEAN_TAKEN_OUT) / (1 + longest) - 1;
  const strings = Math.floor(random() * mostStrings + 1);
  const changed = new Set<number>();
  const seed = Math.floor(random() * fleet.stopCount);
  for (const stop of near[seed] as Int32Array) {
    if (changed.size >= strings) break;
    const crew = routes.crewOf[stop] as number;
    if (crew < 0 || changed.has(crew)) continue;
    const order = routes.order[crew] as number[];
    const most = Math.min(order.length, longest);
    const length = Math.max(1, Math.floor(random() * most + 1));
    onChange(crew);
    changed.add(crew);
    removeString(routes, {
      crew,
      at: order.indexOf(stop),
      length: Math.min(length, order.length),
      random,
    });
    settleRoute(fleet, routes, crew);
  }
}

function removeString(
  routes: Routes,
  string: { crew: number; at: number; length: number; random: Random },
): void {
  const { crew, at, length, random } = string;
  const order = routes.order[crew] as number[];
  let middle = 0;
  if (length > 1 && length < order.length && random() < SPLIT_SHARE) {
    middle = 1;
    while (length + middle < order.length && random() > MIDDLE_ENDS_SHARE) middle += 1;
  }
  const span = length + middle;
  const first = Math.max(0, at - span + 1);
  const last = Math.min(at, order.length - span);
  const start = first + Math.floor(random() * (last - first + 1));
  const keepFrom = start + Math.floor(random() * (length + 1));
  const left: number[] = [];
  for (const [index, stop] of order.entries()) {
    const isInSpan = index >= start && index < start + span;
    const isKept = index >= keepFrom && index < keepFrom + middle;
    if (isInSpan && !isKept) {
      routes.crewOf[stop] = -1;
      routes.unplaced.push(stop);
    } else {
      left.push(stop);
    }
  }
  routes.order[crew] = left;
}
