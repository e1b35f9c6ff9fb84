'use client';

import { type ComponentType, useState } from 'react';
import { TextField } from '@/components/ui/text-field';
import type { LengthUnit } from '@/lib/units/brands';
import { CheckLayout } from './check-layout';
import { TapeMarks } from './tape-marks';
import { typedIn } from './typed-length';

type Lengths<Field extends string> = Record<Field, string>;

type LengthsFormProps<Field extends string, Result> = {
  id: string;
  title: string;
  /** How it is read off the wall, in one line. */
  how: string;
  labels: Lengths<Field>;
  /** The length that the marks of the tape change until another is touched. */
  taped: NoInfer<Field>;
  /** What stands there at first sight, in each unit: out of true, so that it shows what it finds. */
  examples: Record<LengthUnit, Lengths<Field>>;
  check: (
    text: Lengths<Field>,
    unit: LengthUnit,
  ) => { errors: Partial<Lengths<Field>>; notes: string[]; result: Result | null };
  Drawing: ComponentType<{ result: Result; unit: LengthUnit }>;
  Words: ComponentType<{ result: Result; unit: LengthUnit }>;
};

/** Some lengths typed, what they mean beside them: answers with every key, and keeps the last answer while one is half typed. */
export function LengthsForm<Field extends string, Result>({
  id,
  title,
  how,
  labels,
  taped,
  examples,
  check,
  Drawing,
  Words,
}: LengthsFormProps<Field, Result>) {
  const fields = Object.keys(labels) as Field[];
  const [unit, setUnit] = useState<LengthUnit>('in');
  const [text, setText] = useState(examples.in);
  const [active, setActive] = useState<Field>(taped);
  const checked = check(text, unit);
  const [last, setLast] = useState(checked.result);

  const change = (next: Lengths<Field>, nextUnit: LengthUnit) => {
    setUnit(nextUnit);
    setText(next);
    setLast(check(next, nextUnit).result ?? last);
  };
  const isExample = text === examples[unit];
  const changeUnit = (next: LengthUnit) => {
    if (isExample) return change(examples[next], next);
    const carried = fields.map((field) => [field, typedIn(text[field], unit, next)]);
    change(Object.fromEntries(carried), next);
  };
  const shown = checked.result ?? last;
  return (
    <CheckLayout
      id={id}
      title={title}
      how={isExample ? `${how} These figures are an example: type over them.` : how}
      unit={unit}
      onUnit={changeUnit}
      fields={
        <>
          {fields.map((field) => (
            <TextField
              key={field}
              label={labels[field]}
              value={text[field]}
              onChange={(event) => change({ ...text, [field]: event.target.value }, unit)}
              onFocus={(event) => {
                setActive(field);
                event.target.select();
              }}
              error={checked.errors[field]}
              autoComplete="off"
              enterKeyHint="next"
            />
          ))}
          <TapeMarks
            of={labels[active]}
            text={text[active]}
            unit={unit}
            onText={(next) => change({ ...text, [active]: next }, unit)}
          />
        </>
      }
      drawing={shown ? <Drawing result={shown} unit={unit} /> : null}
      isStale={!checked.result}
      words={checked.result ? <Words result={checked.result} unit={unit} /> : null}
      notes={checked.notes}
    />
  );
}
