/** Published instances against their published optima: how far off, in which time. `tsx solomon.ts [each nth instance]` */
import { planDays } from '@/lib/schedule/routes/plan-days';
import {
  checkedDriving,
  type SolomonSize,
  solomonDay,
  solomonNames,
  solomonOptimum,
} from '../help/solomon';

const budgetsMs: [SolomonSize, number][] = [
  [25, 1_000],
  [50, 2_000],
  [100, 5_000],
];
/** More than the time allows: the clock ends the search, the warmth follows the clock. */
const roundsPerSecond: Record<SolomonSize, number> = { 25: 50_000, 50: 33_000, 100: 22_000 };
const each = Number(process.argv[2] ?? 1);
const names = solomonNames.filter((_, index) => index % each === 0);

const table: Record<string, object> = {};
for (const [size, budgetMs] of budgetsMs) {
  const gaps: number[] = [];
  let worst = '';
  let spentMs = 0;
  for (const name of names) {
    const day = solomonDay(name, size);
    const iterations = Math.round((roundsPerSecond[size] * budgetMs) / 1000);
    const began = performance.now();
    const isTimeOver = () => performance.now() - began > budgetMs;
    const { value } = planDays({ ...day, seed: 1, iterations, isTimeOver });
    spentMs += performance.now() - began;
    const driven = checkedDriving(day, value?.routes ?? []);
    const optimum = solomonOptimum(name, size);
    const gap = (driven / optimum - 1) * 100;
    if (gap >= Math.max(0, ...gaps)) worst = `${name} ${gap.toFixed(2)} %`;
    gaps.push(gap);
  }
  const mean = gaps.reduce((sum, gap) => sum + gap, 0) / gaps.length;
  table[`${size} customers, ${names.length} instances`] = {
    'mean gap': `${mean.toFixed(2)} %`,
    worst,
    'at the optimum': gaps.filter((gap) => gap < 0.005).length,
    'mean time': `${(spentMs / names.length / 1000).toFixed(2)} s`,
  };
}
console.table(table);
