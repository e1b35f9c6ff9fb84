/** What each figure of walls, corners and the room's closure is, in words. */

import { type FigureWords, moreHeights, readAgain } from '@/lib/measure/figure-words';
import type { FigureKind } from '@/lib/measure/fit-figure';

export const roomWords = {
  'corner-angle': {
    name: 'Angle of a corner',
    formula:
      'From two legs and the diagonal between their marks, cos θ = (a² + b² − c²) / 2ab; carried from the marks to the straight walls corner to corner, and evened out with the other angles, lengths and diagonals of the room.',
    surer:
      'Longer legs: twice as long halves it. A face row on both walls, because a bow turns the legs.',
    measure: 'angle',
    rounding: 'nearest',
  },
  'corner-deviation': {
    name: 'How far a corner is out',
    formula:
      'The angle of the corner less what was drawn; above nought it is open, below it is closed.',
    surer: 'As for the angle: longer legs, and a face row on both walls.',
    measure: 'angle',
    rounding: 'nearest',
  },
  'corner-offset': {
    name: 'What a corner costs over a depth',
    formula:
      'Depth / tan θ: where the left wall stands at that depth, in the way when the corner is closed.',
    surer: 'Longer legs on the corner, or the length read again at the front of the boxes.',
    measure: 'length',
    rounding: 'nearest',
  },
  'corner-twist': {
    name: 'Twist of a corner',
    formula: 'The greatest angle less the least, over the heights at which the corner was read.',
    surer: 'Longer legs at each height.',
    measure: 'angle',
    rounding: 'nearest',
  },
  'wall-length-read': {
    name: 'Length of a wall as read',
    formula:
      'The mean of the readings at this height; what all of them share by the tool stays in U.',
    surer: readAgain,
    measure: 'length',
    rounding: 'nearest',
  },
  'wall-length-in-pieces': {
    name: 'Length of a wall in pieces',
    formula:
      'The sum of the pieces from mark to mark; each errs for itself, and the tape errs alike in all of them.',
    surer: 'Fewer pieces; the whole in one, where it can be reached.',
    measure: 'length',
    rounding: 'nearest',
  },
  'pieces-against-whole': {
    name: 'Pieces against the whole',
    formula: 'The sum of the pieces of a wall less the whole read at the same height.',
    surer: 'The pieces and the whole read again with one tape.',
    measure: 'length',
    rounding: 'nearest',
  },
  'wall-length': {
    name: 'Length of a wall',
    formula:
      'All lengths, angles and diagonals of the room evened out together (least squares), at the height of the counter.',
    surer: moreHeights,
    measure: 'length',
    rounding: 'nearest',
  },
  'wall-straightness': {
    name: 'Out of straight',
    formula:
      'The width of the narrowest strip between two parallel lines that holds every reading of the row.',
    surer: 'More readings in the row, closer together; a finer gauge for the gap.',
    measure: 'length',
    rounding: 'nearest',
  },
  'wall-straightedge-gap': {
    name: 'Gap under a straightedge',
    formula:
      'The straightedge laid where it shows most and rocked so that its largest gap is as small as it can be.',
    surer: 'More readings in the row where it shows.',
    measure: 'length',
    rounding: 'nearest',
  },
  'wall-lean': {
    name: 'Lean of a wall',
    formula: 'The slope of the line that fits the column of readings best (least squares).',
    surer: 'A taller column, or more readings in it.',
    measure: 'slope',
    rounding: 'nearest',
  },
  'wall-plumb': {
    name: 'Out of plumb',
    formula: 'The lean times the height over which it is asked.',
    surer: 'A taller column, or more readings in it.',
    measure: 'length',
    rounding: 'nearest',
  },
  'wall-flatness': {
    name: 'Out of flat',
    formula:
      'The least distance between two parallel planes that hold every reading of the wall’s face.',
    surer: 'More readings over the face from one set-up.',
    measure: 'length',
    rounding: 'nearest',
  },
  'room-angle-misclosure': {
    name: 'Angles of the room',
    formula: 'The sum of all angles less (corners − 2) × 180°; nought in a room that closes.',
    surer: 'Longer legs on every corner.',
    measure: 'angle',
    rounding: 'nearest',
  },
  'room-linear-misclosure': {
    name: 'Walk round the room',
    formula: 'The gap between where the walk of lengths and angles begins and where it ends.',
    surer: 'Longer legs on the corners; a diagonal.',
    measure: 'length',
    rounding: 'nearest',
  },
} satisfies Partial<Record<FigureKind, FigureWords>>;
