/** What each figure of a run between its ends and against its wall is, in words. */

import { type FigureWords, faceRow, moreHeights } from '@/lib/measure/figure-words';
import type { FigureKind } from '@/lib/measure/fit-figure';

export const runWords = {
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
} satisfies Partial<Record<FigureKind, FigureWords>>;
