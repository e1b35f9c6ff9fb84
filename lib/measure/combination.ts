import { type Figure, figure } from './figure';

/** One independent error: its u, and the readings it belongs to (none for what a set-up shares). */
export type ErrorSource = { ids: string[]; u: number };

/**
 * A value that depends on readings linearly (or linearised), and how much each error weighs in it. What
 * two values share is seen by the source being the same object, so it cancels or adds as it does in life
 * (JCGM 100:2008, 5.2.2: correlation by a common input).
 */
export type Combination = { value: number; parts: Part[] };
export type Part = { source: ErrorSource; weight: number };

/** A weight below this names nobody: a contact that carries nothing does not govern. */
const NO_WEIGHT = 1e-9;

/** A reading as a combination of itself; make it once, or its error counts twice. */
export function readCombination(id: string, value: number, u: number): Combination {
  return { value, parts: [{ source: { ids: [id], u }, weight: 1 }] };
}

export function figureCombination(known: Figure): Combination {
  return { value: known.value, parts: [{ source: { ids: known.from, u: known.u }, weight: 1 }] };
}

/** Σ weight · term. */
export function combine(terms: [weight: number, term: Combination][]): Combination {
  let value = 0;
  const parts: Part[] = [];
  for (let t = 0; t < terms.length; t++) {
    const [weight, term] = terms[t] ?? NOTHING;
    value += weight * term.value;
    for (let p = 0; p < term.parts.length; p++) {
      const part = term.parts[p];
      if (part) addPart(parts, part.source, weight * part.weight);
    }
  }
  return { value, parts };
}

const NOTHING: [number, Combination] = [0, { value: 0, parts: [] }];

/** A plain loop: combinations are made by the thousand in a fit, of a few parts each. */
function addPart(parts: Part[], source: ErrorSource, weight: number): void {
  for (let p = 0; p < parts.length; p++) {
    const known = parts[p];
    if (known?.source !== source) continue;
    known.weight += weight;
    return;
  }
  parts.push({ source, weight });
}

/**
 * The value with u = √Σ(weight · u)² and the readings that govern it.
 * Edge rule: a reading with no weight is not named.
 * Example: 2·a − b with u(a) = 0.3, u(b) = 0.8 → u = 1.0, from a and b.
 * Source: JCGM 100:2008, 5.1.2 equation (10).
 */
export function combinationFigure({ value, parts }: Combination): Figure {
  const from: string[] = [];
  let square = 0;
  for (const { source, weight } of parts) {
    if (Math.abs(weight) <= NO_WEIGHT) continue;
    square += (weight * source.u) ** 2;
    for (const id of source.ids) if (!from.includes(id)) from.push(id);
  }
  return figure(value, Math.sqrt(square), from);
}
