import type { Room } from '@/lib/contracts/wall-book';
import { namedWalls } from './name-walls';

export type Chains = Room['chains'];
export type RoomShape = 'one' | 'l' | 'u' | 'galley' | 'closed';

/** Guessed until the measurer types them: 12 ft along, 9 ft across. */
export const GUESSED_MM = { along: 3_657.6, across: 2_743.2 };

const { along, across } = GUESSED_MM;
/** Lengths of each chain's walls; every corner starts square. */
const shapes: Record<RoomShape, { closed: boolean; lengthsMm: number[] }[]> = {
  one: [{ closed: false, lengthsMm: [along] }],
  l: [{ closed: false, lengthsMm: [along, across] }],
  u: [{ closed: false, lengthsMm: [across, along, across] }],
  galley: [
    { closed: false, lengthsMm: [along] },
    { closed: false, lengthsMm: [along] },
  ],
  closed: [{ closed: true, lengthsMm: [along, across, along, across] }],
};

export const roomShapeWords: Record<RoomShape, string> = {
  one: 'One wall',
  l: 'L',
  u: 'U',
  galley: 'Galley',
  closed: 'All round',
};

/**
 * Walls of a shape picked by one touch, named A, B … clockwise.
 *
 * Edge: an open chain's first wall has no corner at its left.
 * Example: `l` gives A, and B with a 90° corner at its left.
 */
export function chainsOfShape(shape: RoomShape, newId: () => string): Chains {
  return namedWalls(
    shapes[shape].map(({ closed, lengthsMm }) => ({
      closed,
      walls: lengthsMm.map((nominalLengthMm, at) => ({
        id: newId(),
        name: '',
        nominalLengthMm,
        leftCornerDeg: at === 0 && !closed ? null : 90,
      })),
    })),
  );
}
