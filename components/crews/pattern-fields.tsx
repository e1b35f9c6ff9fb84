'use client';

import { useId } from 'react';
import { Button } from '@/components/ui/button';
import { controlLook } from '@/components/ui/field-frame';
import { mostWeeksOfPattern } from '@/lib/schedule/working-pattern';
import { readHours } from './hours-text';
import { dayNames } from './pattern-words';

/** Seven texts a week, Monday first. */
export type WeekTexts = readonly string[];

type PatternFieldsProps = {
  weeks: readonly WeekTexts[];
  onChange: (weeks: WeekTexts[]) => void;
};

/** The days and hours of a crew: one line a week, one field a day; Tab goes through them. */
export function PatternFields({ weeks, onChange }: PatternFieldsProps) {
  const id = useId();
  const put = (week: number, day: number, text: string) =>
    onChange(
      weeks.map((texts, at) =>
        at === week ? texts.map((old, index) => (index === day ? text : old)) : texts,
      ),
    );
  return (
    <div className="flex flex-col gap-2">
      {weeks
        .map((texts, week) => ({ texts, week, number: week + 1 }))
        .map(({ texts, week, number }) => (
          <fieldset
            key={number}
            className="grid grid-cols-[repeat(auto-fill,minmax(7.5rem,1fr))] gap-2"
          >
            <legend className="mb-1 text-note text-graphite">
              {weeks.length === 1 ? 'Each week' : `Week ${number} of ${weeks.length}`}
            </legend>
            {texts.map((text, day) => {
              const name = dayNames[day] ?? '';
              const { error } = readHours(text);
              const fieldId = `${id}-${week}-${name}`;
              return (
                <div key={name}>
                  <label htmlFor={fieldId} className="text-note font-medium">
                    {name}
                  </label>
                  <input
                    id={fieldId}
                    value={text}
                    placeholder="off"
                    autoComplete="off"
                    className={`${controlLook} tabular-nums`}
                    aria-invalid={error ? true : undefined}
                    aria-describedby={error ? `${fieldId}-error` : undefined}
                    onChange={(event) => put(week, day, event.target.value)}
                  />
                  {error ? (
                    <p id={`${fieldId}-error`} className="text-note text-chalk">
                      {error}
                    </p>
                  ) : null}
                </div>
              );
            })}
          </fieldset>
        ))}
      <div className="flex gap-2">
        {weeks.length < mostWeeksOfPattern ? (
          <Button look="plain" onClick={() => onChange([...weeks, [...(weeks.at(-1) ?? [])]])}>
            Another week that follows
          </Button>
        ) : null}
        {weeks.length > 1 ? (
          <Button look="plain" onClick={() => onChange(weeks.slice(0, -1))}>
            Take the last week away
          </Button>
        ) : null}
      </div>
    </div>
  );
}
