'use client';

import { checkCorner } from './check-corner';
import { CornerDrawing } from './corner-drawing';
import { CornerWords } from './corner-words';
import { LengthsForm } from './lengths-form';

/** Check a corner: two marks on the walls, the line between them, and how deep a cabinet stands there. */
export function CornerForm() {
  return (
    <LengthsForm
      id="corner"
      title="Check a corner"
      how="Mark each wall some way out of the corner, at one height, and measure from mark to mark."
      labels={{
        legLeft: 'Along the left wall',
        legRight: 'Along the right wall',
        diagonal: 'Mark to mark',
        depth: 'Depth of the base',
      }}
      taped="diagonal"
      examples={{
        in: { legLeft: '36', legRight: '48', diagonal: '59 3/8', depth: '24' },
        mm: { legLeft: '900', legRight: '1200', diagonal: '1484', depth: '600' },
      }}
      check={checkCorner}
      Drawing={CornerDrawing}
      Words={CornerWords}
    />
  );
}
