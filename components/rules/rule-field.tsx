import { type ComponentProps, useId } from 'react';
import { classNames } from '@/components/ui/class-names';
import { FieldError } from '@/components/ui/field-error';
import { controlLook, fieldAttributes } from '@/components/ui/field-frame';

export type ErrorOf = (field: string) => string | undefined;

type RuleFieldProps = Omit<ComponentProps<'input'>, 'name'> & {
  name: string;
  label: string;
  /** What it moves, and where its start value comes from. */
  hint: string;
  errorOf: ErrorOf;
};

/** Where the server names what stands against a rule: as it is typed, or under the set that it belongs to. */
const places = ['', 'fit.', 'booking.', 'keeping.'];

/** One rule as a line of a schedule: what it is and what it moves, and its value at the right. */
export function RuleField({ name, label, hint, errorOf, className, ...input }: RuleFieldProps) {
  const id = useId();
  const error = places.map((place) => errorOf(place + name)).find(Boolean);
  return (
    <div className="grid grid-cols-[minmax(0,1fr)_8.5rem] items-baseline gap-x-5 border-b border-rule py-2">
      <label htmlFor={id} className="font-medium">
        {label}
      </label>
      <input
        type="text"
        autoComplete="off"
        name={name}
        className={classNames(controlLook, 'row-span-2 text-right tabular-nums', className)}
        {...input}
        {...fieldAttributes(id, { hint, error })}
      />
      <p id={`${id}-hint`} className="text-note text-graphite">
        {hint}
      </p>
      <div className="col-span-2">
        <FieldError id={`${id}-error`} error={error} />
      </div>
    </div>
  );
}
