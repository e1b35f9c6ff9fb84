'use client';

import { controlLook } from '@/components/ui/field-frame';
import { type Run, type Unit, unitKind } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import { alterableAbout, newUnit } from '@/lib/sheet/new-run';
import { unitKindName, unitWords } from '@/lib/sheet/unit-words';
import { LengthField } from './length-field';
import { UnitPicks } from './unit-picks';

type UnitRowsProps = {
  run: Run;
  rules: FitRules;
  onUnits: (units: Unit[]) => void;
};

/** Sheets that a width may stack: an applied panel is one; a box is built to its width. */
const sheetCounts = [0, 1, 2, 3, 4] as const;

/** The boxes of a run, left to right: what each is, how wide, and how far it may be changed. */
export function UnitRows({ run, rules, onUnits }: UnitRowsProps) {
  const { units } = run;
  const change = (id: string, change: Partial<Unit>) =>
    onUnits(units.map((unit) => (unit.id === id ? { ...unit, ...change } : unit)));
  const move = (from: number, to: number) => {
    const next = [...units];
    const [moved] = next.splice(from, 1);
    if (moved) next.splice(to, 0, moved);
    onUnits(next);
  };
  return (
    <>
      <div className="overflow-x-auto">
        <table className="w-full border-collapse">
          <caption className="sr-only">Units of {run.name}, left to right</caption>
          <thead>
            <tr className="border-b border-ink text-left text-note text-graphite">
              <th scope="col" className="py-1 pr-2 font-normal">
                kind
              </th>
              <th scope="col" className="px-2 font-normal">
                name
              </th>
              <th scope="col" className="px-2 text-right font-normal">
                width
              </th>
              <th scope="col" className="px-2 font-normal">
                may be built
              </th>
              <th scope="col" className="pl-2 text-right font-normal">
                place
              </th>
            </tr>
          </thead>
          <tbody>
            {units.map((unit, index) => (
              <tr key={unit.id} className="border-b border-rule align-top">
                <td className="py-1.5 pr-2">
                  <select
                    aria-label={`Kind of unit ${index + 1}`}
                    value={unit.kind}
                    className={`${controlLook} min-w-32`}
                    onChange={(event) => {
                      const kind = unitKind.parse(event.target.value);
                      change(unit.id, {
                        ...newUnit(rules, { id: unit.id, kind }),
                        name: unit.name,
                      });
                    }}
                  >
                    {unitKind.options.map((kind) => (
                      <option key={kind} value={kind}>
                        {unitKindName(kind, rules.region)}
                      </option>
                    ))}
                  </select>
                </td>
                <td className="px-2 py-1.5">
                  <input
                    aria-label={`Name of unit ${index + 1}`}
                    value={unit.name}
                    maxLength={40}
                    className={`${controlLook} min-w-24`}
                    onChange={(event) => change(unit.id, { name: event.target.value })}
                  />
                </td>
                <td className="px-2 py-1.5">
                  <LengthField
                    label={`Width of ${unitWords(unit, rules.region)}`}
                    mm={unit.widthMm}
                    unit={rules.unit}
                    kind="unit-width"
                    isBare
                    onMm={(widthMm) => change(unit.id, { widthMm })}
                  />
                  <select
                    aria-label={`What the width of ${unitWords(unit, rules.region)} stacks`}
                    value={unit.sheets ?? 0}
                    className="mt-1 w-full text-note text-graphite"
                    onChange={(event) =>
                      change(unit.id, { sheets: Number(event.target.value) || undefined })
                    }
                  >
                    {sheetCounts.map((count) => (
                      <option key={count} value={count}>
                        {count === 0 ? 'built to it' : count === 1 ? '1 sheet' : `${count} sheets`}
                      </option>
                    ))}
                  </select>
                </td>
                <td className="px-2 py-1.5">
                  <Alterable
                    unit={unit}
                    rules={rules}
                    onChange={(alterable) => change(unit.id, { alterable })}
                  />
                </td>
                <td className="py-1.5 pl-2 text-right whitespace-nowrap">
                  <PlaceButton
                    label={`Move ${unitWords(unit, rules.region)} left`}
                    sign="←"
                    isOff={index === 0}
                    onPress={() => move(index, index - 1)}
                  />
                  <PlaceButton
                    label={`Move ${unitWords(unit, rules.region)} right`}
                    sign="→"
                    isOff={index === units.length - 1}
                    onPress={() => move(index, index + 1)}
                  />
                  <PlaceButton
                    label={`Take ${unitWords(unit, rules.region)} out`}
                    sign="✕"
                    isOff={false}
                    onPress={() => onUnits(units.filter(({ id }) => id !== unit.id))}
                  />
                </td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
      <UnitPicks level={run.level} rules={rules} onPick={(unit) => onUnits([...units, unit])} />
    </>
  );
}

function Alterable({
  unit,
  rules,
  onChange,
}: {
  unit: Unit;
  rules: FitRules;
  onChange: (alterable: Unit['alterable']) => void;
}) {
  const { alterable } = unit;
  return (
    <div className="flex items-start gap-2">
      <select
        aria-label={`Whether ${unitWords(unit, rules.region)} may be changed`}
        value={alterable ? 'alterable' : 'fixed'}
        className={`${controlLook} min-w-44`}
        onChange={(event) =>
          onChange(event.target.value === 'fixed' ? null : alterableAbout(unit.widthMm, rules))
        }
      >
        <option value="fixed">as it is only</option>
        <option value="alterable">from, to, in steps of</option>
      </select>
      {alterable
        ? (['minMm', 'maxMm', 'stepMm'] as const).map((field) => (
            <div key={field} className="w-22">
              <LengthField
                label={`${fieldWords[field]} of ${unitWords(unit, rules.region)}`}
                mm={alterable[field]}
                unit={rules.unit}
                isBare
                onMm={(mm) => onChange({ ...alterable, [field]: mm })}
              />
            </div>
          ))
        : null}
    </div>
  );
}

const fieldWords = { minMm: 'Narrowest', maxMm: 'Widest', stepMm: 'Step' };

function PlaceButton({
  label,
  sign,
  isOff,
  onPress,
}: {
  label: string;
  sign: string;
  isOff: boolean;
  onPress: () => void;
}) {
  return (
    <button
      type="button"
      aria-label={label}
      disabled={isOff}
      onClick={onPress}
      className="min-h-9 min-w-9 rounded border border-transparent hover:border-pine disabled:text-rule max-sm:min-h-thumb max-sm:min-w-12"
    >
      {sign}
    </button>
  );
}
