/** What each figure that a saw is set by is, in words. */

import { type FigureWords, faceRow, moreHeights } from '@/lib/measure/figure-words';
import type { FigureKind } from '@/lib/measure/fit-figure';

export const cutWords = {
  'filler-width': {
    name: 'Face width of a filler',
    formula: 'From the last box to the end wall in the plane of the filler’s face, at this height.',
    surer: `${moreHeights} ${faceRow}`,
    measure: 'length',
    rounding: 'nearest',
  },
  'filler-taper': {
    name: 'Taper of a filler',
    formula: 'Face width at the top less face width at the bottom.',
    surer:
      'The length read at the top and at the bottom of the run, or a plumb column on the end wall.',
    measure: 'length',
    rounding: 'nearest',
  },
  'filler-blank': {
    name: 'Blank of a filler',
    formula:
      'The least face width plus the scribe allowance of that edge, rounded up once: wide enough at the widest place, with stock to scribe.',
    surer: `${moreHeights} ${faceRow}`,
    measure: 'length',
    rounding: 'up',
  },
  'filler-cut': {
    name: 'Cut of a filler',
    formula: 'The face width at this height, at which the scribe line runs.',
    surer: moreHeights,
    measure: 'length',
    rounding: 'nearest',
  },
  'edge-out-of-true': {
    name: 'Out of true along an edge',
    formula: 'How far the wall falls back from the edge beyond the place where they touch first.',
    surer: 'Face readings along this edge.',
    measure: 'length',
    rounding: 'up',
  },
  'scribe-allowance': {
    name: 'Scribe allowance',
    formula:
      'Out of true along the edge, plus its U, plus the shop’s working margin; never under the shop’s least scribe; rounded up.',
    surer: 'Face readings along this edge make its U, and so the allowance, smaller.',
    measure: 'length',
    rounding: 'up',
  },
  'kick-face-blank': {
    name: 'Blank of the kick face',
    formula:
      'The least height along the face line plus the scribe allowance of its foot, rounded up once.',
    surer: 'Floor readings along the face line.',
    measure: 'length',
    rounding: 'up',
  },
  'ceiling-blank': {
    name: 'Blank of the piece to the ceiling',
    formula:
      'The least gap to the ceiling plus the scribe allowance of its top edge, rounded up once.',
    surer: 'Ceiling readings above the run, from the set-up of the floor readings.',
    measure: 'length',
    rounding: 'up',
  },
  'saw-angle': {
    name: 'Saw for a mitre',
    formula: 'Each piece is cut at half the corner; the saw reads |90° − θ/2|.',
    surer: 'Longer legs on the corner.',
    measure: 'angle',
    rounding: 'nearest',
  },
  'crown-mitre': {
    name: 'Crown on the saw: mitre',
    formula:
      'atan(sin s ÷ tan(θ/2)), s between the moulding’s back and the wall, θ the corner; the moulding lies flat.',
    surer: 'Longer legs on the corner; the spring angle off the moulding itself.',
    measure: 'angle',
    rounding: 'nearest',
  },
  'crown-bevel': {
    name: 'Crown on the saw: tilt of the blade',
    formula:
      'asin(cos s · cos(θ/2)), s between the moulding’s back and the wall, θ the corner; the moulding lies flat.',
    surer: 'Longer legs on the corner; the spring angle off the moulding itself.',
    measure: 'angle',
    rounding: 'nearest',
  },
} satisfies Partial<Record<FigureKind, FigureWords>>;
