'use client';

import { useId, useState } from 'react';
import { FieldError } from '@/components/ui/field-error';
import { controlLook } from '@/components/ui/field-frame';
import { fineLength } from '@/lib/sheet/reading-words';
import type { LengthUnit } from '@/lib/units/brands';
import { parseLength } from '@/lib/units/parse-length';

type LimitFieldProps = {
  label: string;
  limitMm: number;
  unit: LengthUnit;
  onChange: (limitMm: number) => void;
};

/** One figure of a limit, typed as the shop writes lengths; what cannot be read is said, and changes nothing. */
export function LimitField({ label, limitMm, unit, onChange }: LimitFieldProps) {
  const errorId = useId();
  const [error, setError] = useState<string | undefined>();
  const shown = fineLength(limitMm, unit);
  const read = (typed: string) => {
    setError(undefined);
    if (typed.trim() === shown) return;
    const { value, problems } = parseLength(typed, { unit });
    if (value === null) setError(problems[0]?.message ?? 'That is no length.');
    else onChange(value);
  };
  return (
    <div>
      <input
        aria-label={label}
        aria-invalid={error ? true : undefined}
        aria-describedby={error ? errorId : undefined}
        defaultValue={shown}
        onBlur={(event) => read(event.target.value)}
        className={`${controlLook} max-w-28 text-right tabular-nums`}
      />
      <FieldError id={errorId} error={error} />
    </div>
  );
}
