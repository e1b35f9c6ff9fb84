import { type ComponentProps, useId } from 'react';
import { FieldError } from './field-error';
import { type FieldProps, fieldAttributes } from './field-frame';

type CheckFieldProps = Omit<FieldProps, 'isOptional'> &
  Omit<ComponentProps<'input'>, 'children' | 'type'>;

/** One yes or no. The whole line is the target. */
export function CheckField({ label, hint, error, ...input }: CheckFieldProps) {
  const ownId = useId();
  const id = input.id ?? ownId;
  return (
    <div>
      <label
        htmlFor={id}
        className="flex min-h-9 items-center gap-2.5 py-1 in-[.in-sun]:min-h-thumb"
      >
        <input
          type="checkbox"
          className="size-5 shrink-0 accent-pine in-[.in-sun]:size-7"
          {...input}
          {...fieldAttributes(id, { hint, error })}
        />
        {label}
      </label>
      {hint ? (
        <p id={`${id}-hint`} className="pl-7.5 text-note text-graphite">
          {hint}
        </p>
      ) : null}
      <FieldError id={`${id}-error`} error={error} />
    </div>
  );
}
