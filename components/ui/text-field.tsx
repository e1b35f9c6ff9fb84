import { type ComponentProps, useId } from 'react';
import { classNames } from './class-names';
import { controlLook, FieldFrame, type FieldProps, fieldAttributes } from './field-frame';

type TextFieldProps = FieldProps & Omit<ComponentProps<'input'>, 'children'>;

export function TextField({ label, hint, error, isOptional, className, ...input }: TextFieldProps) {
  const ownId = useId();
  const id = input.id ?? ownId;
  return (
    <FieldFrame {...{ id, label, hint, error, isOptional }}>
      <input
        type="text"
        className={classNames(controlLook, className)}
        {...input}
        {...fieldAttributes(id, { hint, error })}
      />
    </FieldFrame>
  );
}
