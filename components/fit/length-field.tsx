'use client';

import { useId, useState } from 'react';
import { controlLook } from '@/components/ui/field-frame';
import { fineLength } from '@/lib/sheet/reading-words';
import type { LengthKind } from '@/lib/units/length-limits';
import { parseLength } from '@/lib/units/parse-length';

type LengthFieldProps = {
  label: string;
  mm: number;
  unit: 'in' | 'mm';
  kind?: LengthKind;
  onMm: (mm: number) => void;
  /** Its label is in the table's head. */
  isBare?: boolean;
  /** From the server, beside what is wrong with the text itself. */
  error?: string;
};

/** A length typed as the trade types it: "34 1/2", "876", "2' 10". Kept as typed until it is left. */
export function LengthField({ label, mm, unit, kind, onMm, isBare, error }: LengthFieldProps) {
  const id = useId();
  const [typed, setTyped] = useState<string | null>(null);
  const shown = typed ?? fineLength(mm, unit).replace(/ mm$|"$/, '');
  const problem = typed === null ? null : (parseLength(typed, { unit, kind }).problems[0] ?? null);
  const words = problem?.message ?? error;
  return (
    <div className="flex flex-col gap-1">
      <label htmlFor={id} className={isBare ? 'sr-only' : 'font-medium'}>
        {label}
      </label>
      <input
        id={id}
        type="text"
        autoComplete="off"
        value={shown}
        aria-invalid={words ? true : undefined}
        aria-describedby={words ? `${id}-error` : undefined}
        className={`${controlLook} text-right ${isBare ? 'min-w-20' : ''}`}
        onChange={(event) => {
          const text = event.target.value;
          setTyped(text);
          const { value } = parseLength(text, { unit, kind });
          if (value !== null) onMm(value);
        }}
        onBlur={() =>
          setTyped((text) =>
            text !== null && parseLength(text, { unit, kind }).value === null ? text : null,
          )
        }
      />
      {words ? (
        <p id={`${id}-error`} className="text-note font-medium text-chalk">
          {words}
        </p>
      ) : null}
    </div>
  );
}
