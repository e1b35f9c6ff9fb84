import { describe, expect, it } from 'vitest';
import {
  readToolFields,
  shownToolField,
  type ToolKind,
  type ToolSpec,
  toolFields,
  toolKindWords,
  toolWorth,
  usualSpec,
} from '@/lib/rules/tool-spec';
import type { LengthUnit } from '@/lib/units/brands';

const kinds = Object.keys(toolKindWords) as ToolKind[];
const units: LengthUnit[] = ['in', 'mm'];

/** The form as it is shown. */
const shown = (spec: ToolSpec, unit: LengthUnit) =>
  Object.fromEntries(
    toolFields[spec.kind].map((field) => [field.key, shownToolField(spec, field, unit)]),
  );

describe('a measuring tool in the shop rules', () => {
  it.each(kinds.flatMap((kind) => units.map((unit) => [kind, unit] as const)))(
    '%s in %s: a form that nobody touched changes nothing',
    (kind, unit) => {
      const spec = usualSpec(kind, unit);
      expect(readToolFields(shown(spec, unit), spec, unit)).toEqual({ spec, errors: {} });
    },
  );

  it('takes a maker’s millimetres in a shop that thinks in inches', () => {
    const spec = usualSpec('laser', 'in');
    const typed = { ...shown(spec, 'in'), mpeMm: '2 mm', statedAt95: 'yes' };
    expect(readToolFields(typed, spec, 'in').spec).toMatchObject({ mpeMm: 2, statedAt95: true });
  });

  it('says at its field what is no figure, or none that a tool can have', () => {
    const spec = usualSpec('angle-finder', 'mm');
    const typed = { ...shown(spec, 'mm'), mpeDeg: 'fine', stepDeg: '0' };
    const { spec: read, errors } = readToolFields(typed, spec, 'mm');
    expect(read).toBeNull();
    expect(Object.keys(errors).sort()).toEqual(['mpeDeg', 'stepDeg']);
  });

  it('tells what it is worth: a class II tape over 3 m between two walls is ±1.7 mm', () => {
    expect(toolWorth(usualSpec('tape', 'mm'), 'mm')).toMatch(/±1\.7 mm$/);
    // MPE 0.3 + 0.2·3 + 2·0.2 = 1.3 for class II and 0.1 + 0.1·3 + 2·0.1 = 0.6 for class I (MI-008).
    const better: ToolSpec = { kind: 'tape', accuracyClass: 'I', stepMm: 1, repeatabilityMm: 0.3 };
    expect(toolWorth(better, 'mm')).toMatch(/±1\.1 mm$/);
  });
});
