/** DIN 18202, tolerances in building construction: tables 2 and 3. */
import type { Rule, RuleSet } from './rule-set';

const SPANS_MM = [100, 1_000, 4_000, 10_000, 15_000];

/**
 * Table 3, limits for flatness deviation: rows by number, mm at 0.1, 1, 4, 10 and 15 m.
 * Source: four copies (face-consultants, Zentralverband des Deutschen Baugewerbes handbook, and two
 * more); where one copy differs (row 5 last columns, row 4 at 1 m) the other three are followed.
 */
export const DIN_18202_TABLE_3: Readonly<Record<number, { use: string; mm: readonly number[] }>> = {
  1: { use: 'unfinished tops of floors, sub-floors', mm: [10, 15, 20, 25, 30] },
  2: { use: 'the same, higher requirement; subordinate finished floors', mm: [5, 8, 12, 15, 20] },
  3: { use: 'finished floors', mm: [2, 4, 10, 12, 15] },
  4: { use: 'finished floors, higher requirement', mm: [1, 3, 9, 12, 15] },
  5: { use: 'unfinished walls and soffits', mm: [5, 10, 15, 25, 30] },
  6: { use: 'finished walls and ceilings', mm: [3, 5, 10, 20, 25] },
  7: { use: 'finished walls and ceilings, higher requirement', mm: [2, 3, 8, 15, 20] },
};

/** Table 2, limits for angular deviation (offset in mm) by nominal size. Source: beaplan.de. */
export const DIN_18202_TABLE_2 = [
  { toMm: 500, limitMm: 3 },
  { toMm: 1_000, limitMm: 6 },
  { toMm: 3_000, limitMm: 8 },
  { toMm: 6_000, limitMm: 12 },
  { toMm: 15_000, limitMm: 16 },
  { toMm: 30_000, limitMm: 20 },
  { toMm: Number.MAX_SAFE_INTEGER, limitMm: 30 },
] as const;

const flat = (check: Rule['check'], row: number, action: string): Rule => ({
  check,
  limit: {
    kind: 'interpolated',
    points: SPANS_MM.map((spanMm, i) => ({
      spanMm,
      limitMm: DIN_18202_TABLE_3[row]?.mm[i] ?? 0,
    })),
  },
  overMm: null,
  sense: 'most',
  source: 'DIN 18202',
  edition: 'as copied in 2010–2020 handbooks',
  clause: `table 3, row ${row}: ${DIN_18202_TABLE_3[row]?.use ?? ''}`,
  address: 'https://www.face-consultants.com/din-18202/',
  action,
});

const angular = (check: Rule['check'], action: string): Rule => ({
  check,
  limit: { kind: 'bands', rows: DIN_18202_TABLE_2 },
  overMm: null,
  sense: 'most',
  source: 'DIN 18202',
  edition: 'as copied in 2010–2020 handbooks',
  clause: 'table 2; a nominal size on a boundary belongs to the lower band',
  address:
    'https://www.beaplan.de/technische-beurteilung/pruefung-von-ebenheit-und-winkeltoleranz/',
  action,
});

const TO_CUSTOMER = 'Tell the customer before cabinets are built to it.';

function dinSet(id: string, name: string, wallRow: number, floorRow: number): RuleSet {
  return {
    id,
    name,
    region: 'EU',
    rules: [
      flat('wall-straightness', wallRow, TO_CUSTOMER),
      flat('ceiling-straightness', wallRow, TO_CUSTOMER),
      flat('floor-straightness', floorRow, TO_CUSTOMER),
      angular('wall-plumb', TO_CUSTOMER),
      angular('corner-square', TO_CUSTOMER),
      angular('floor-fall', TO_CUSTOMER),
      angular('ceiling-fall', TO_CUSTOMER),
    ],
  };
}

/** Finished walls (row 6) and floors (row 3). */
export const din18202 = dinSet('din-18202', 'DIN 18202', 6, 3);
/** Higher requirement: rows 7 and 4. */
export const din18202Higher = dinSet('din-18202-higher', 'DIN 18202, higher requirement', 7, 4);
