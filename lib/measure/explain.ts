/** What every figure of a fit is, how it comes about, in words, and what would make it surer. */
import type { FigureKind } from '@/lib/measure/fit-figure';

export type FigureWords = {
  /** "Blank of a filler". */
  name: string;
  /** The formula, as one would say it at the bench. */
  formula: string;
  /** What would make U smaller. */
  surer: string;
  measure: 'length' | 'angle' | 'slope';
  /** Which way it is rounded when it is shown: blanks and gaps to cover up, openings down. */
  rounding: 'up' | 'down' | 'nearest';
};

const readAgain = 'Reading it again with the same tool helps a little; with a better tool, more.';
const moreHeights = 'Reading the length at three heights, and the corners on longer legs.';
const faceRow = 'A row of face readings on the end wall, so that its bow need not be assumed.';

/**
 * Each kind of figure in words, keyed as the fit marks it.
 *
 * Edge: every kind of figure has its words; the compiler holds that.
 * Example: `figureWords['filler-blank'].rounding` is 'up': a blank is cut down, never up.
 * Source: MEASURE sections 4 to 13 in DEVELOPERS.md; uncertainty JCGM 100:2008, k = 2.
 */
export const figureWords: Record<FigureKind, FigureWords> = {
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
  'clear-opening': {
    name: 'Clear opening of a run',
    formula:
      'The largest square block that stands plumb on the set line between the ends: the least place of the right end less the greatest of the left, over the depth to the door fronts and the height of the run.',
    surer: `${moreHeights} ${faceRow}`,
    measure: 'length',
    rounding: 'down',
  },
  'run-room': {
    name: 'Room for the boxes',
    formula:
      'The length less, at each end, the greater of what keeps the gable clear of the wall and what leaves the least filler.',
    surer: moreHeights,
    measure: 'length',
    rounding: 'down',
  },
  'run-slack': {
    name: 'Slack of a run',
    formula: 'Room for the boxes less all their widths and what each joint grows.',
    surer: moreHeights,
    measure: 'length',
    rounding: 'nearest',
  },
  'free-room': {
    name: 'Free room at an open end',
    formula: 'From the finished end to the limit that was set for it.',
    surer: moreHeights,
    measure: 'length',
    rounding: 'down',
  },
  'wall-to-cut': {
    name: 'Wall to cut back',
    formula: 'How far the wall stands proud of a plane that something already set holds fast.',
    surer: 'A face reading at this place.',
    measure: 'length',
    rounding: 'up',
  },
  'set-line-gap': {
    name: 'Largest gap behind a run',
    formula:
      'The plumb plane behind the cabinets touches the wall where it stands proud most and is turned so that its largest gap is as small as it can be.',
    surer: 'More face readings behind the run.',
    measure: 'length',
    rounding: 'up',
  },
  'back-gap': {
    name: 'Gap behind a cabinet',
    formula: 'From the set line back to the wall’s face at this place.',
    surer: 'A face reading at this place.',
    measure: 'length',
    rounding: 'up',
  },
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
  'kick-height': {
    name: 'Height of the kick',
    formula:
      'The level foot of the boxes down to the floor at this corner: nominal plus how far the floor has dropped.',
    surer: 'A floor reading at this corner, from the same set-up.',
    measure: 'length',
    rounding: 'nearest',
  },
  'kick-face-blank': {
    name: 'Blank of the kick face',
    formula:
      'The least height along the face line plus the scribe allowance of its foot, rounded up once.',
    surer: 'Floor readings along the face line.',
    measure: 'length',
    rounding: 'up',
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
  'ceiling-blank': {
    name: 'Blank of the piece to the ceiling',
    formula:
      'The least gap to the ceiling plus the scribe allowance of its top edge, rounded up once.',
    surer: 'Ceiling readings above the run, from the set-up of the floor readings.',
    measure: 'length',
    rounding: 'up',
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
  aisle: {
    name: 'Aisle',
    formula:
      'Between the fronts that face each other, doors and handles counted, at its narrowest.',
    surer: 'The width between the walls read at the aisle itself.',
    measure: 'length',
    rounding: 'down',
  },
  'pipe-offset': {
    name: 'From the middle of the sink to a pipe',
    formula: 'Where the pipe comes up, less where the middle of the sink will stand.',
    surer: 'The pipe read again from two walls.',
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
};
