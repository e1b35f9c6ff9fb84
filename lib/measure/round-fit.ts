/** Rounds every number of a fit, so that phone and server agree to the byte. */

const GRAIN = 1e4;

/** To 1e-4, ties away from zero, no −0; everything else as it is. */
export function roundFit<T>(value: T): T {
  return rounded(value) as T;
}

function rounded(value: unknown): unknown {
  if (typeof value === 'number') return roundNumber(value);
  // Lists of reading ids make up most of a fit and hold nothing to round.
  if (Array.isArray(value)) return typeof value[0] === 'string' ? value : value.map(rounded);
  if (value === null || typeof value !== 'object') return value;
  const copy: Record<string, unknown> = {};
  for (const key of Object.keys(value)) copy[key] = rounded(value[key as keyof typeof value]);
  return copy;
}

function roundNumber(value: number): number {
  if (!Number.isFinite(value)) return value;
  const scaled = Math.abs(value) * GRAIN;
  // A hair over the half, so that a value that two machines reckon apart in the last bit falls one way.
  const whole = Math.floor(scaled + 0.5 + 1e-7);
  return whole === 0 ? 0 : (Math.sign(value) * whole) / GRAIN;
}
