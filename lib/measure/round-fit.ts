/** Rounds every number of a fit, so that phone and server agree to the byte. */

const GRAIN = 1e4;

/**
 * To 1e-4, ties away from zero, no −0, in place: the value has just been made, and copying it costs more
 * than reckoning it. Everything but numbers stays as it is.
 */
export function roundFit<T extends object>(value: T): T {
  if (Array.isArray(value)) roundList(value);
  else roundFields(value as Record<string, unknown>);
  return value;
}

function roundFields(fields: Record<string, unknown>): void {
  for (const key in fields) {
    const field = fields[key];
    if (typeof field === 'number') fields[key] = roundNumber(field);
    else if (typeof field === 'object' && field !== null) roundFit(field);
  }
}

function roundList(list: unknown[]): void {
  // Lists of reading ids make up most of a fit and hold nothing to round.
  if (typeof list[0] === 'string') return;
  for (let i = 0; i < list.length; i++) {
    const item = list[i];
    if (typeof item === 'number') list[i] = roundNumber(item);
    else if (typeof item === 'object' && item !== null) roundFit(item);
  }
}

function roundNumber(value: number): number {
  if (!Number.isFinite(value)) return value;
  const scaled = Math.abs(value) * GRAIN;
  // A hair over the half, so that a value that two machines reckon apart in the last bit falls one way.
  const whole = Math.floor(scaled + 0.5 + 1e-7);
  return whole === 0 ? 0 : (Math.sign(value) * whole) / GRAIN;
}
