/** Which regular spacing the studs found stand at, if one can be told. */

export type FoundStud = { id: string; centreMm: number; u: number };

export type StudGrid = {
  spacingMm: number;
  /** Place of one stud of the grid along the wall, mm. */
  phaseMm: number;
  uPhase: number;
  /** The studs that stand on it; odd ones are left out. */
  onGrid: FoundStud[];
};

/** A regular row is believed from this many studs on. */
const LEAST_ON_GRID = 3;
/** Closer than this nobody frames a wall. */
const LEAST_SPACING_MM = 100;
/** A stud stands on a grid within two of its standard uncertainties (GUM, k = 2). */
const WITHIN_U = 2;

/**
 * The one spacing that the studs fit, or null when none or more than one does.
 *
 * Edge: odd studs (beside openings, in corners) are ignored as long as most stand on the grid; of two
 * spacings the one with more studs on it wins, and with as many on each nothing is stated.
 * Example: 102, 508, 914, 1321 ± 3 fit 406.4 and not 400: 406.4.
 * Source: common practice, no source.
 */
export function studGrid(studs: FoundStud[], spacingsMm: readonly number[]): StudGrid | null {
  const fits = spacingsMm
    .filter((spacing) => spacing >= LEAST_SPACING_MM)
    .flatMap((spacing) => gridOf(studs, spacing) ?? [])
    .filter(({ onGrid }) => onGrid.length >= LEAST_ON_GRID && 2 * onGrid.length > studs.length);
  const most = fits.reduce((best, { onGrid }) => Math.max(best, onGrid.length), 0);
  const best = fits.filter(({ onGrid }) => onGrid.length === most);
  return best.length === 1 ? (best[0] ?? null) : null;
}

/** The grid of one spacing that takes the most studs, each stud tried as its origin. */
function gridOf(studs: FoundStud[], spacingMm: number): StudGrid | null {
  let best: StudGrid | null = null;
  for (const origin of studs) {
    const seed = studs.filter(
      (stud) =>
        Math.abs(offGrid(stud.centreMm, origin.centreMm, spacingMm)) <=
        WITHIN_U * Math.hypot(stud.u, origin.u),
    );
    const grid = refine(seed, origin.centreMm, spacingMm);
    const onGrid = studs.filter(
      (stud) => Math.abs(offGrid(stud.centreMm, grid.phaseMm, spacingMm)) <= WITHIN_U * stud.u,
    );
    const places = new Set(
      onGrid.map((stud) => Math.round((stud.centreMm - grid.phaseMm) / spacingMm)),
    );
    if (places.size < onGrid.length) continue;
    if (onGrid.length > (best?.onGrid.length ?? 0)) best = { ...grid, onGrid };
  }
  return best;
}

/** Weighted mean of the phases of the studs taken. */
function refine(studs: FoundStud[], nearMm: number, spacingMm: number): Omit<StudGrid, 'onGrid'> {
  let [weights, sum] = [0, 0];
  for (const stud of studs) {
    const weight = 1 / stud.u ** 2;
    weights += weight;
    sum += weight * offGrid(stud.centreMm, nearMm, spacingMm);
  }
  return { spacingMm, phaseMm: nearMm + sum / weights, uPhase: 1 / Math.sqrt(weights) };
}

function offGrid(placeMm: number, phaseMm: number, spacingMm: number): number {
  const along = placeMm - phaseMm;
  return along - spacingMm * Math.round(along / spacingMm);
}
