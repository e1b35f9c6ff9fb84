'use client';

import { useState } from 'react';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import type { LengthUnit } from '@/lib/units/brands';
import { CheckLayout } from './check-layout';
import { checkWall, type WallText } from './check-wall';
import { GapFields } from './gap-fields';
import { typedIn } from './typed-length';
import { WallDrawing } from './wall-drawing';
import { WallWords } from './wall-words';

/** A hollow, so that the first sight of the tool says what it finds. */
const examples: Record<LengthUnit, WallText> = {
  in: { way: 'along', spacing: '12', gaps: ['0', '1/16', '1/8', '3/16', '1/8', '1/16', '0'] },
  mm: { way: 'along', spacing: '300', gaps: ['0', '1.5', '3', '4.5', '3', '1', '0'] },
};

/** Check a wall: seven gaps to a straightedge laid along it, or to a level stood against it. */
export function WallForm() {
  const [unit, setUnit] = useState<LengthUnit>('in');
  const [text, setText] = useState(examples.in);
  const check = checkWall(text, unit);
  const [last, setLast] = useState(check.result);

  const change = (next: WallText, nextUnit: LengthUnit) => {
    setUnit(nextUnit);
    setText(next);
    setLast(checkWall(next, nextUnit).result ?? last);
  };
  const typeGap = (place: number, gap: string) =>
    change({ ...text, gaps: text.gaps.map((old, at) => (at === place ? gap : old)) }, unit);
  const shown = check.result ?? last;
  return (
    <CheckLayout
      id="wall"
      title="Check a wall"
      how="Lay a straightedge along the wall, or stand a level plumb against it, and read the gap behind it at even places."
      unit={unit}
      onUnit={(next) => {
        const { way, spacing, gaps } = text;
        const inNext = (typed: string) => typedIn(typed, unit, next);
        const isExample = gaps === examples[unit].gaps && spacing === examples[unit].spacing;
        change(
          isExample
            ? { ...examples[next], way }
            : { way, spacing: inNext(spacing), gaps: gaps.map(inNext) },
          next,
        );
      }}
      fields={
        <>
          <SelectField
            label="The straightedge"
            value={text.way}
            onChange={(event) =>
              change({ ...text, way: event.target.value === 'up' ? 'up' : 'along' }, unit)
            }
            options={[
              { value: 'along', label: 'laid along' },
              { value: 'up', label: 'stood plumb' },
            ]}
          />
          <TextField
            label="Read every"
            value={text.spacing}
            onChange={(event) => change({ ...text, spacing: event.target.value }, unit)}
            error={check.spacingError}
            autoComplete="off"
          />
        </>
      }
      fieldsOver={<GapFields text={text} errors={check.gapErrors} onGap={typeGap} />}
      drawing={shown ? <WallDrawing result={shown} way={text.way} unit={unit} /> : null}
      isStale={!check.result}
      words={check.result ? <WallWords result={check.result} unit={unit} /> : null}
      notes={check.notes}
    />
  );
}
