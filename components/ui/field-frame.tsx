import type { ReactNode } from 'react';
import { FieldError } from './field-error';

/** What the kinds of field share: a label above, a hint and the error below, tied to the control by id. */
export type FieldProps = {
  label: string;
  /** What to type, where the label cannot say it. */
  hint?: ReactNode;
  error?: string;
  isOptional?: boolean;
};

type FieldFrameProps = FieldProps & { id: string; children: ReactNode };

export function FieldFrame({ id, label, hint, error, isOptional, children }: FieldFrameProps) {
  return (
    <div className="flex flex-col gap-1">
      <label htmlFor={id} className="font-medium">
        {label}
        {isOptional ? <span className="font-normal text-graphite"> (if any)</span> : null}
      </label>
      {children}
      {hint ? (
        <p id={hintId(id)} className="text-note text-graphite">
          {hint}
        </p>
      ) : null}
      <FieldError id={errorId(id)} error={error} />
    </div>
  );
}

/** The attributes that tie a control to its frame. */
export function fieldAttributes(id: string, { hint, error }: Pick<FieldProps, 'hint' | 'error'>) {
  const describedBy = [hint ? hintId(id) : null, error ? errorId(id) : null].filter(Boolean);
  return {
    id,
    'aria-invalid': error ? true : undefined,
    'aria-describedby': describedBy.length > 0 ? describedBy.join(' ') : undefined,
  };
}

/** One line to write on: a full box, with the base line drawn stronger. */
export const controlLook =
  'w-full rounded border border-graphite bg-sheet px-2.5 py-1.5 text-body text-ink min-h-9 ' +
  'placeholder:text-graphite aria-invalid:border-chalk aria-invalid:border-l-4 ' +
  'in-[.in-sun]:min-h-thumb in-[.in-sun]:text-lead disabled:bg-tint disabled:text-graphite';

const hintId = (id: string) => `${id}-hint`;
const errorId = (id: string) => `${id}-error`;
