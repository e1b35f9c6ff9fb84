import { type Figure, figure } from './figure';

/**
 * A value that depends on readings linearly (or linearised): each part is one independent error, how
 * much it weighs and whose reading it is. What two values share is seen by its key, so it cancels or
 * adds as it does in life (JCGM 100:2008, 5.2.2: correlation by a common input).
 */
export type Combination = { value: number; parts: Part[] };
export type Part = {
  /** One independent error. Two parts with the same key are the same error. */
  key: string;
  /** Ids of readings this error belongs to; none for what a whole set-up shares. */
  ids: string[];
  u: number;
  weight: number;
};

/** A weight below this names nobody: a contact that carries nothing does not govern. */
const NO_WEIGHT = 1e-9;

export function readCombination(id: string, value: number, u: number): Combination {
  return { value, parts: [{ key: `reading:${id}`, ids: [id], u, weight: 1 }] };
}

export function figureCombination(key: string, known: Figure): Combination {
  return { value: known.value, parts: [{ key, ids: known.from, u: known.u, weight: 1 }] };
}

/** Σ weight · term. */
export function combine(terms: [weight: number, term: Combination][]): Combination {
  let value = 0;
  const parts = new Map<string, Part>();
  for (const [weight, term] of terms) {
    value += weight * term.value;
    for (const part of term.parts) {
      const known = parts.get(part.key);
      if (known) known.weight += weight * part.weight;
      else parts.set(part.key, { ...part, weight: weight * part.weight });
    }
  }
  return { value, parts: [...parts.values()] };
}

/**
 * The value with u = √Σ(weight · u)² and the readings that govern it.
 * Edge rule: a reading with no weight is not named.
 * Example: 2·a − b with u(a) = 0.3, u(b) = 0.8 → u = 1.0, from a and b.
 * Source: JCGM 100:2008, 5.1.2 equation (10).
 */
export function combinationFigure({ value, parts }: Combination): Figure {
  const governing = parts.filter((part) => Math.abs(part.weight) > NO_WEIGHT);
  const from = new Set(governing.flatMap((part) => part.ids));
  return figure(value, Math.hypot(...governing.map((part) => part.weight * part.u)), [...from]);
}
