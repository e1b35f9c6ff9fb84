'use client';

import { useState } from 'react';
import { TextField } from '@/components/ui/text-field';
import { TitleBlock } from '@/components/ui/title-block';
import type { LengthUnit } from '@/lib/units/brands';
import { type CornerField, type CornerText, checkCorner } from './check-corner';
import { CornerDrawing } from './corner-drawing';
import { CornerWords } from './corner-words';
import { UnitChoice } from './unit-choice';

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
export function CornerForm({ startUnit = 'in' }: { startUnit?: LengthUnit }) {
  const [unit, setUnit] = useState(startUnit);
  const [text, setText] = useState(examples[startUnit]);
  const [last, setLast] = useState(() => checkCorner(examples[startUnit], startUnit).result);
  const check = checkCorner(text, unit);

  const type = (field: CornerField, value: string) => {
    const next = { ...text, [field]: value };
    setText(next);
    setLast(checkCorner(next, unit).result ?? last);
  };
  const changeUnit = (next: LengthUnit) => {
    setUnit(next);
    setText(examples[next]);
    setLast(checkCorner(examples[next], next).result);
  };
  return (
    <section id="corner">
      <TitleBlock
        title="Check a corner"
        meta={<UnitChoice unit={unit} onUnit={changeUnit} name="corner-unit" />}
      />
      <div className="grid items-start gap-x-8 gap-y-5 pt-4 md:grid-cols-[11rem_minmax(0,1fr)] lg:grid-cols-[11rem_minmax(0,1fr)_19rem]">
        <div className="grid grid-cols-2 items-end gap-x-4 gap-y-3 md:grid-cols-1">
          {(Object.keys(labels) as CornerField[]).map((field) => (
            <TextField
              key={field}
              label={labels[field]}
              value={text[field]}
              onChange={(event) => type(field, event.target.value)}
              error={check.errors[field]}
              autoComplete="off"
              inputMode="text"
            />
          ))}
        </div>
        <div className={check.result ? '' : 'opacity-60'}>
          {last ? <CornerDrawing result={check.result ?? last} unit={unit} /> : null}
        </div>
        <div className="md:col-span-2 lg:col-span-1" aria-live="polite">
          {check.result ? <CornerWords result={check.result} unit={unit} /> : null}
          {check.notes.map((note) => (
            <p key={note} className="pt-2 text-ochre">
              {note}
            </p>
          ))}
        </div>
      </div>
    </section>
  );
}
