'use client';

import { useState } from 'react';
import { TextField } from '@/components/ui/text-field';
import type { LengthUnit } from '@/lib/units/brands';
import { checkFiller, type FillerField, type FillerText } from './check-filler';
import { CheckLayout } from './check-layout';
import { FillerDrawing } from './filler-drawing';
import { FillerWords } from './filler-words';

const examples: Record<LengthUnit, FillerText> = {
  in: { top: '1 13/16', middle: '1 7/8', bottom: '2 1/8' },
  mm: { top: '46', middle: '48', bottom: '54' },
};

const labels: Record<FillerField, string> = {
  top: 'Gap at the top',
  middle: 'In the middle',
  bottom: 'At the bottom',
};

/** Get the filler: the gap between a plumb cabinet and the wall, read at three heights. */
export function FillerForm() {
  const [unit, setUnit] = useState<LengthUnit>('in');
  const [text, setText] = useState(examples.in);
  const check = checkFiller(text, unit);
  const [last, setLast] = useState(check.result);

  const change = (next: FillerText, nextUnit: LengthUnit) => {
    setUnit(nextUnit);
    setText(next);
    setLast(checkFiller(next, nextUnit).result ?? last);
  };
  const shown = check.result ?? last;
  return (
    <CheckLayout
      id="filler"
      title="Get the filler"
      unit={unit}
      onUnit={(next) => change(examples[next], next)}
      fields={(Object.keys(labels) as FillerField[]).map((field) => (
        <TextField
          key={field}
          label={labels[field]}
          value={text[field]}
          onChange={(event) => change({ ...text, [field]: event.target.value }, unit)}
          error={check.errors[field]}
          autoComplete="off"
        />
      ))}
      drawing={shown ? <FillerDrawing result={shown} unit={unit} /> : null}
      isStale={!check.result}
      words={check.result ? <FillerWords result={check.result} unit={unit} /> : null}
      notes={check.notes}
    />
  );
}
