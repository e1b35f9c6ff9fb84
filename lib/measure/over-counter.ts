import { type Outcome, problem, refused } from '@/lib/problem';
import { type Figure, figure } from './figure';
import { type HeightCheck, heightCheck } from './height-check';

/** The top of a counter over the datum: one place for a level one, both ends of an old one. */
export type CounterTop = { id: string; topMm: Figure }[];

/**
 * Least gap from a counter to the underside of what hangs over it.
 * Edge rule: of an old counter's two ends the higher one counts.
 * Example: underside 1372, counter 914 at one end and 917 at the other → 455, 2 less than 457.
 * Problems: counter-not-read. Source: common practice, no source.
 */
export function upperGap(
  counter: CounterTop,
  undersideMm: number,
  needMm: number,
): Outcome<HeightCheck> {
  const highest = highestOf(counter);
  if (highest === null || !Number.isFinite(undersideMm + needMm))
    return refused(counterNotRead(counter));
  const gap = figure(undersideMm - highest.value, highest.u, highest.from);
  return { value: heightCheck(gap, needMm), problems: [] };
}

/**
 * Room from a counter to a window sill, against the splash that stands between.
 * Edge rule: of an old counter's two ends the higher one counts.
 * Example: sill 1030 ± 2, counter 914, splash 100 → height 116, margin 16.
 * Problems: counter-not-read. Source: common practice, no source.
 */
export function sillOverCounter(
  counter: CounterTop,
  splashMm: number,
  sill: Figure,
): Outcome<HeightCheck> {
  const highest = highestOf(counter);
  if (highest === null || !Number.isFinite(splashMm + sill.value))
    return refused(counterNotRead(counter));
  const u = Math.hypot(sill.u, highest.u);
  const room = figure(sill.value - highest.value, u, [...new Set([...sill.from, ...highest.from])]);
  return { value: heightCheck(room, splashMm), problems: [] };
}

export type CounterStep = { id: string; step: Figure; verdict: 'flush' | 'in-doubt' | 'stepped' };

/**
 * The step from an old counter to a new one at each end of the old, which may not be level: new − old.
 * Edge rule: flush where |step| + U stays within the limit, stepped where |step| − U is past it.
 * Example: new 914, old 913 and 909 (U 1 each), limit 2 → 1 flush, 5 stepped.
 * Problems: counter-not-read. Source: common practice, no source.
 */
export function counterSteps(
  newTop: Figure,
  old: CounterTop,
  limitMm: number,
): Outcome<CounterStep[]> {
  if (highestOf(old) === null || !Number.isFinite(newTop.value + limitMm)) {
    return refused(counterNotRead(old));
  }
  const steps = old.map(({ id, topMm }): CounterStep => {
    const from = [...new Set([...newTop.from, ...topMm.from])];
    const step = figure(newTop.value - topMm.value, Math.hypot(newTop.u, topMm.u), from);
    const size = Math.abs(step.value);
    if (size + step.U <= limitMm) return { id, step, verdict: 'flush' };
    return { id, step, verdict: size - step.U > limitMm ? 'stepped' : 'in-doubt' };
  });
  return { value: steps, problems: [] };
}

function highestOf(counter: CounterTop): Figure | null {
  let highest: Figure | null = null;
  for (const { topMm } of counter) {
    if (!Number.isFinite(topMm.value + topMm.u)) return null;
    if (highest === null || topMm.value > highest.value) highest = topMm;
  }
  return highest;
}

function counterNotRead(counter: CounterTop) {
  const words = 'The height of the counter is not known here. Read it at both ends.';
  return problem(
    'counter-not-read',
    words,
    counter.map(({ id }) => id),
  );
}
