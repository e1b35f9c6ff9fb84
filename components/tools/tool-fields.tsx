import { CheckField } from '@/components/ui/check-field';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import { shownToolField, type ToolSpec, toolFields } from '@/lib/rules/tool-spec';
import type { LengthUnit } from '@/lib/units/brands';

type ToolFieldsProps = {
  name: string;
  spec: ToolSpec;
  unit: LengthUnit;
  errorOf: (field: string) => string | undefined;
};

/** What the maker's sheet of a tool says, and how the shop reads it. */
export function ToolFields({ name, spec, unit, errorOf }: ToolFieldsProps) {
  return (
    <div className="grid gap-3 sm:grid-cols-2">
      <TextField
        label="Called"
        name="name"
        defaultValue={name}
        maxLength={60}
        required
        error={errorOf('name')}
      />
      {toolFields[spec.kind].map((field) => {
        const { key, label, hint, as } = field;
        const shown = shownToolField(spec, field, unit);
        const error = errorOf(key) ?? errorOf(`spec.${key}`);
        if (as === 'yes') {
          return (
            <CheckField
              key={key}
              label={label}
              hint={hint}
              name={key}
              value="yes"
              defaultChecked={shown === 'yes'}
            />
          );
        }
        return as === 'class' ? (
          <SelectField
            key={key}
            label={label}
            hint={hint}
            name={key}
            defaultValue={shown}
            options={['I', 'II', 'III'].map((value) => ({ value, label: value }))}
          />
        ) : (
          <TextField
            key={key}
            label={label}
            hint={hint}
            name={key}
            defaultValue={shown}
            error={error}
          />
        );
      })}
    </div>
  );
}
