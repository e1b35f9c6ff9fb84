'use client';

import { checkFiller } from './check-filler';
import { FillerDrawing } from './filler-drawing';
import { FillerWords } from './filler-words';
import { LengthsForm } from './lengths-form';

/** Get the filler: the gap between a plumb cabinet and the wall, read at three heights. */
export function FillerForm() {
  return (
    <LengthsForm
      id="filler"
      title="Get the filler"
      how="Stand the last cabinet plumb and measure from its face to the wall at three heights."
      labels={{ top: 'Gap at the top', middle: 'In the middle', bottom: 'At the bottom' }}
      taped="top"
      examples={{
        in: { top: '1 13/16', middle: '1 7/8', bottom: '2 1/8' },
        mm: { top: '46', middle: '48', bottom: '54' },
      }}
      check={checkFiller}
      Drawing={FillerDrawing}
      Words={FillerWords}
    />
  );
}
