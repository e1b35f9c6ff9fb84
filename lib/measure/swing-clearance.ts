/** Doors and drawers beside a wall or casing: have they room to open? */
import type { Unit } from '@/lib/contracts/runs';
import { bothUnits } from '@/lib/units/both-units';
import type { Measured } from './measured';
import { exactInches as inches } from './rules/exact-inches';

type Clearance = { leastMm: number; overCasingMm: number; source: string };

/** Room at the side of a unit that stands beside a wall, by kind; the maker's sheet decides, warn only. */
export const SWING_CLEARANCES: Partial<Record<Unit['kind'], Clearance>> = {
  refrigerator: {
    leastMm: inches(3),
    overCasingMm: 0,
    source: 'shops leave about 3 in beside a deep wall; makers 2 1/16 to 4 1/2 (F16)',
  },
  dishwasher: { leastMm: inches(2), overCasingMm: 0, source: 'a maker’s instructions: 2 in (F19)' },
  range: { leastMm: inches(6), overCasingMm: 0, source: 'makers 0 to 6 in: ask under 6 (F23)' },
  drawers: {
    leastMm: inches(1.5),
    overCasingMm: inches(1 / 2),
    source: '1 1/2 in, or casing + 1/2 (F05); judgement',
  },
};

export type SwingShort = {
  unitId: string;
  neededMm: number;
  shortMm: number;
  source: string;
  words: string;
};

/**
 * Units at the end of a run whose doors or drawers have not the room that their kind usually needs.
 *
 * `room`: from the unit's side to the wall or casing at the front, mm. Edge: kinds without a figure are
 * let be; a room less its U counts. Example: a refrigerator 40 ± 2 (U) from a wall: 76.2 needed, 38.2 short.
 * Problems: none. Source: practice records as named in the table.
 */
export function swingsBesideWall(
  ends: {
    unitId: string;
    name: string;
    kind: Unit['kind'];
    room: Measured;
    casingProjectionMm: number;
  }[],
): SwingShort[] {
  return ends.flatMap(({ unitId, name, kind, room, casingProjectionMm }) => {
    const clearance = SWING_CLEARANCES[kind];
    if (!clearance) return [];
    const overCasing = clearance.overCasingMm > 0 ? casingProjectionMm + clearance.overCasingMm : 0;
    const neededMm = Math.max(clearance.leastMm, overCasing);
    const shortMm = neededMm - (room.value - 2 * room.u);
    if (shortMm <= 0) return [];
    const words = `${name || `The ${kind}`} may not open fully: ${bothUnits(shortMm)} short of ${bothUnits(neededMm)} beside the wall. The maker’s sheet decides.`;
    return [{ unitId, neededMm, shortMm, source: clearance.source, words }];
  });
}
