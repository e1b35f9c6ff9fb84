'use client';

import { useState } from 'react';
import { TextField } from '@/components/ui/text-field';
import type { LengthUnit } from '@/lib/units/brands';
import { type CornerField, type CornerText, checkCorner } from './check-corner';
import { CheckLayout } from './check-layout';
import { CornerDrawing } from './corner-drawing';
import { CornerWords } from './corner-words';

/** A corner that is out, so that the first sight of the tool says what it finds. */
const examples: Record<LengthUnit, CornerText> = {
  in: { legLeft: '36', legRight: '48', diagonal: '59 3/8', depth: '24' },
  mm: { legLeft: '900', legRight: '1200', diagonal: '1484', depth: '600' },
};

const labels: Record<CornerField, string> = {
  legLeft: 'Along the left wall',
  legRight: 'Along the right wall',
  diagonal: 'Mark to mark',
  depth: 'Depth of the base',
};

/** Check a corner: answers as it is typed, keeps the last answer while a length is half typed. */
export function CornerForm() {
  const [unit, setUnit] = useState<LengthUnit>('in');
  const [text, setText] = useState(examples.in);
  const check = checkCorner(text, unit);
  const [last, setLast] = useState(check.result);

  const change = (next: CornerText, nextUnit: LengthUnit) => {
    setUnit(nextUnit);
    setText(next);
    setLast(checkCorner(next, nextUnit).result ?? last);
  };
  const shown = check.result ?? last;
  return (
    <CheckLayout
      id="corner"
      title="Check a corner"
      unit={unit}
      onUnit={(next) => change(examples[next], next)}
      fields={(Object.keys(labels) as CornerField[]).map((field) => (
        <TextField
          key={field}
          label={labels[field]}
          value={text[field]}
          onChange={(event) => change({ ...text, [field]: event.target.value }, unit)}
          error={check.errors[field]}
          autoComplete="off"
        />
      ))}
      drawing={shown ? <CornerDrawing result={shown} unit={unit} /> : null}
      isStale={!check.result}
      words={check.result ? <CornerWords result={check.result} unit={unit} /> : null}
      notes={check.notes}
    />
  );
}
