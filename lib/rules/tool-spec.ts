import { type Tool, tool as toolShape } from '@/lib/contracts/wall-book';
import { angleUncertainty, lengthUncertainty } from '@/lib/measure/uncertainty';
import { fineLength } from '@/lib/sheet/reading-words';
import type { LengthUnit } from '@/lib/units/brands';
import { parseLength } from '@/lib/units/parse-length';

const toolSpec = toolShape.shape.spec;
export type ToolSpec = Tool['spec'];
export type ToolKind = ToolSpec['kind'];

export type ToolField = {
  key: string;
  label: string;
  hint: string;
  /** `class`: of a tape; `length` is typed as lengths are, `number` as it is; `yes`: ticked or not. */
  as: 'class' | 'length' | 'number' | 'yes';
};

export const toolKindWords: Record<ToolKind, string> = {
  tape: 'tape',
  laser: 'laser meter',
  'angle-finder': 'angle finder',
  level: 'level or straightedge',
};

const step = (as: ToolField['as']): ToolField =>
  as === 'number'
    ? { key: 'stepDeg', label: 'Read to, degrees', hint: 'the last figure it shows', as }
    : { key: 'stepMm', label: 'Read to', hint: 'the least that you note', as };
const repeat = (as: ToolField['as']): ToolField => ({
  key: as === 'number' ? 'repeatabilityDeg' : 'repeatabilityMm',
  label: as === 'number' ? 'Read twice, degrees' : 'Read twice, it differs by',
  hint: 'one standard deviation; read a thing ten times to know',
  as,
});
const at95: ToolField = {
  key: 'statedAt95',
  label: 'The sheet says “typical”, “95 %” or “2σ”',
  hint: 'then it is no limit, and half of it counts',
  as: 'yes',
};

/** What is asked of each kind of tool, in the order of its maker's sheet. */
export const toolFields: Record<ToolKind, ToolField[]> = {
  tape: [
    { key: 'accuracyClass', label: 'Class', hint: 'printed on the blade in an oval', as: 'class' },
    step('length'),
    repeat('length'),
  ],
  laser: [
    { key: 'mpeMm', label: 'Off by at most, ±', hint: 'from the maker’s sheet', as: 'length' },
    at95,
    step('length'),
    repeat('length'),
  ],
  'angle-finder': [
    { key: 'mpeDeg', label: 'Off by at most, ± degrees', hint: 'from its sheet', as: 'number' },
    at95,
    step('number'),
    repeat('number'),
  ],
  level: [
    {
      key: 'mpeMmPerM',
      label: 'Off by at most, ± mm in each metre',
      hint: 'from its sheet; turn it round to see',
      as: 'number',
    },
    at95,
    step('length'),
    repeat('length'),
  ],
};

/** What a new tool of a kind starts with: common practice, as a new shop's tools are. */
export function usualSpec(kind: ToolKind, unit: LengthUnit): ToolSpec {
  const stepMm = unit === 'in' ? 25.4 / 16 : 1;
  switch (kind) {
    case 'tape':
      return { kind, accuracyClass: 'II', stepMm, repeatabilityMm: 0.3 };
    case 'laser':
      return { kind, mpeMm: 1.5, stepMm: unit === 'in' ? 25.4 / 32 : 1, repeatabilityMm: 0.3 };
    case 'angle-finder':
      return { kind, mpeDeg: 0.1, stepDeg: 0.1, repeatabilityDeg: 0.05 };
    case 'level':
      return { kind, mpeMmPerM: 0.5, stepMm: 0.5, repeatabilityMm: 0.3 };
  }
}

/** A field of a tool as its form shows it. */
export function shownToolField(spec: ToolSpec, { key, as }: ToolField, unit: LengthUnit): string {
  const value = Object.entries(spec).find(([name]) => name === key)?.[1];
  if (as === 'yes') return value === true ? 'yes' : '';
  return as === 'length' ? fineLength(Number(value), unit) : String(value);
}

type ReadTool = { spec: ToolSpec | null; errors: Record<string, string> };

/** The form's texts as a tool; a text that was left keeps its exact value, what cannot be read is said. */
export function readToolFields(
  fields: Record<string, string>,
  before: ToolSpec,
  unit: LengthUnit,
): ReadTool {
  const errors: Record<string, string> = {};
  const values: Record<string, unknown> = { ...before };
  for (const field of toolFields[before.kind]) {
    const { key, as } = field;
    const typed = (fields[key] ?? '').trim();
    if (as === 'yes') values[key] = typed === 'yes' ? true : undefined;
    else if (typed === shownToolField(before, field, unit)) continue;
    else if (as === 'class') values[key] = typed;
    else {
      const value = as === 'length' ? parseLength(typed, { unit }).value : Number(typed);
      if (typed !== '' && value !== null && value >= 0) values[key] = value;
      else errors[key] = as === 'length' ? 'Write a length, as 1.5 mm or 1/16.' : 'Write a number.';
    }
  }
  const { data, error } = toolSpec.safeParse(values);
  for (const { path } of error?.issues ?? []) errors[String(path[0])] ??= 'More than nothing.';
  return Object.keys(errors).length > 0 ? { spec: null, errors } : { spec: data ?? null, errors };
}

const wallMm = 3_000;

/**
 * What a tool is worth, for who has to choose its figures: twice the standard uncertainty of one reading.
 * Example: a tape of class II read to 1 mm: "a wall of 3 m from corner to corner: ±1.7 mm".
 */
export function toolWorth(spec: ToolSpec, unit: LengthUnit): string {
  const tool: Tool = { id: '', name: '', spec };
  if (spec.kind === 'angle-finder') {
    return `a corner: ±${(2 * angleUncertainty(tool)).toFixed(2)}°`;
  }
  if (spec.kind === 'level') {
    const U = 2 * lengthUncertainty(tool, 1_000, 0);
    return `plumb over ${unit === 'in' ? '39"' : 'a metre'}: ±${fineLength(U, unit)}`;
  }
  const wall = unit === 'in' ? '118"' : '3 m';
  return `a wall of ${wall}, corner to corner: ±${fineLength(2 * lengthUncertainty(tool, wallMm, 2), unit)}`;
}
