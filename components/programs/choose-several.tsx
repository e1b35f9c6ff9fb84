import { CheckField } from '@/components/ui/check-field';
import { FieldError } from '@/components/ui/field-error';

type ChooseSeveralProps = {
  legend: string;
  /** Fields are named "prefix:value", so that several can be read from one form. */
  prefix: string;
  words: Record<string, string>;
  error?: string;
};

export function ChooseSeveral({ legend, prefix, words, error }: ChooseSeveralProps) {
  return (
    <fieldset>
      <legend className="font-bold">{legend}</legend>
      {Object.entries(words).map(([value, label]) => (
        <CheckField key={value} label={label} name={`${prefix}:${value}`} value="yes" />
      ))}
      <FieldError error={error} />
    </fieldset>
  );
}

/** What was ticked, in the order shown. */
export function chosenOf(prefix: string, fields: Record<string, string>): string[] {
  return Object.keys(fields)
    .filter((name) => name.startsWith(`${prefix}:`))
    .map((name) => name.slice(prefix.length + 1));
}
