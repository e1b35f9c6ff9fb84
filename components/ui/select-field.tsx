import { type ComponentProps, useId } from 'react';
import { classNames } from './class-names';
import { controlLook, FieldFrame, type FieldProps, fieldAttributes } from './field-frame';

type SelectFieldProps = FieldProps &
  Omit<ComponentProps<'select'>, 'children'> & {
    options: { value: string; label: string; isDisabled?: boolean }[];
    /** The line shown while nothing is chosen. */
    emptyLabel?: string;
  };

export function SelectField({
  label,
  hint,
  error,
  isOptional,
  options,
  emptyLabel,
  className,
  ...select
}: SelectFieldProps) {
  const ownId = useId();
  const id = select.id ?? ownId;
  return (
    <FieldFrame {...{ id, label, hint, error, isOptional }}>
      <select
        className={classNames(controlLook, className)}
        {...select}
        {...fieldAttributes(id, { hint, error })}
      >
        {emptyLabel === undefined ? null : <option value="">{emptyLabel}</option>}
        {options.map((option) => (
          <option key={option.value} value={option.value} disabled={option.isDisabled}>
            {option.label}
          </option>
        ))}
      </select>
    </FieldFrame>
  );
}
