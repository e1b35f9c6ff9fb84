import { type ComponentProps, useId } from 'react';
import { classNames } from './class-names';
import { controlLook, FieldFrame, type FieldProps, fieldAttributes } from './field-frame';

type TextareaFieldProps = FieldProps & Omit<ComponentProps<'textarea'>, 'children'>;

export function TextareaField({
  label,
  hint,
  error,
  isOptional,
  className,
  ...textarea
}: TextareaFieldProps) {
  const ownId = useId();
  const id = textarea.id ?? ownId;
  return (
    <FieldFrame {...{ id, label, hint, error, isOptional }}>
      <textarea
        rows={3}
        className={classNames(controlLook, 'field-sizing-content', className)}
        {...textarea}
        {...fieldAttributes(id, { hint, error })}
      />
    </FieldFrame>
  );
}
