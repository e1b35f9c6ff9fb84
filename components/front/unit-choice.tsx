import type { LengthUnit } from '@/lib/units/brands';

type UnitChoiceProps = { unit: LengthUnit; onUnit: (unit: LengthUnit) => void; name: string };

const words: Record<LengthUnit, string> = { in: 'inches', mm: 'mm' };

export function UnitChoice({ unit, onUnit, name }: UnitChoiceProps) {
  return (
    <fieldset className="flex gap-4">
      <legend className="sr-only">Typed in</legend>
      {(['in', 'mm'] as const).map((choice) => (
        <label key={choice} className="flex min-h-9 items-center gap-1.5">
          <input
            type="radio"
            name={name}
            value={choice}
            checked={unit === choice}
            onChange={() => onUnit(choice)}
            className="size-4 accent-pine"
          />
          {words[choice]}
        </label>
      ))}
    </fieldset>
  );
}
