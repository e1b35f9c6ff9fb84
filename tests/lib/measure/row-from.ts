import type { ProfilePoint } from '@/lib/measure/profile';

/** Published columns of x and y as a row of readings. */
export function rowFrom(x: number[], y: number[], u: number | number[] = 1): ProfilePoint[] {
  return x.map((atMm, at) => ({
    id: `${at}`,
    atMm,
    sMm: y[at] ?? Number.NaN,
    u: typeof u === 'number' ? u : (u[at] ?? Number.NaN),
  }));
}
