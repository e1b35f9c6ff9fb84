/** What each figure of floor, ceiling and the way in is, in words. */

import { type FigureWords, readAgain } from '@/lib/measure/figure-words';
import type { FigureKind } from '@/lib/measure/fit-figure';

export const heightWords = {
  'floor-fall': {
    name: 'Fall of the floor',
    formula: 'The greatest drop from the level line less the least; the least is the high point.',
    surer: 'Readings at the high and the low point again, from the same set-up.',
    measure: 'length',
    rounding: 'nearest',
  },
  'clear-height': {
    name: 'Clear height',
    formula:
      'Drop to the floor plus rise to the ceiling at one place; the least of all places is told.',
    surer: readAgain,
    measure: 'length',
    rounding: 'down',
  },
  'kick-height': {
    name: 'Height of the kick',
    formula:
      'The level foot of the boxes down to the floor at this corner: nominal plus how far the floor has dropped.',
    surer: 'A floor reading at this corner, from the same set-up.',
    measure: 'length',
    rounding: 'nearest',
  },
  'appliance-height': {
    name: 'Clear height for an appliance',
    formula:
      'From the finished floor at its highest under the appliance to the underside of the counter.',
    surer: 'Floor readings under the appliance.',
    measure: 'length',
    rounding: 'down',
  },
  'ceiling-gap': {
    name: 'Gap to the ceiling',
    formula: 'From the top of the boxes to the ceiling at this place.',
    surer: 'Ceiling readings above the run, from the set-up of the floor readings.',
    measure: 'length',
    rounding: 'nearest',
  },
  'upper-gap': {
    name: 'Counter to the units above',
    formula: 'From the counter up to the underside of the boxes that hang over it.',
    surer: 'Floor readings under the run.',
    measure: 'length',
    rounding: 'down',
  },
  'tilt-height': {
    name: 'Height to stand a unit up',
    formula:
      'Clear height less the diagonal of the unit as it is tilted, √(h² + d²), less the shop’s margin.',
    surer: 'Clear heights where the unit is stood up.',
    measure: 'length',
    rounding: 'down',
  },
  'way-in-margin': {
    name: 'Room to spare on the way in',
    formula: 'The doorway past its leaf and stop less the two smaller sides of the unit.',
    surer: readAgain,
    measure: 'length',
    rounding: 'down',
  },
} satisfies Partial<Record<FigureKind, FigureWords>>;
