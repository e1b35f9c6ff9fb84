import type { FeatureKind, Reading, ReadingOf } from '@/lib/contracts/readings';
import { type Problem, problem } from '@/lib/problem';
import { entryValue } from './entry-value';
import { entryText, isEmptyEntry, type PadEntry } from './pad-entry';
import type { PadField } from './pad-fields';

/** Places on the wall: from the left corner, and up from the finished floor. */
export const featureFields: PadField[] = [
  { name: 'x0', label: 'left', kind: 'position' },
  { name: 'width', label: 'width', kind: 'unit-width' },
  { name: 'z0', label: 'up', kind: 'height' },
  { name: 'height', label: 'height', kind: 'unit-width' },
  { name: 'projection', label: 'out', kind: 'projection', isOptional: true },
];

/** What opens, and so needs to be told which way. */
export const opens = (feature: FeatureKind): boolean =>
  feature === 'window' || feature === 'door' || feature === 'panel';

type FeatureInput = {
  entries: Record<string, PadEntry | undefined>;
  common: Pick<
    ReadingOf<'feature'>,
    | 'id'
    | 'roomId'
    | 'toolId'
    | 'takenAt'
    | 'unit'
    | 'touches'
    | 'replaces'
    | 'wallId'
    | 'feature'
    | 'swing'
  >;
};

/**
 * A feature of the wall from what was typed, or why it is none, naming the field.
 *
 * Edge: what stands out may be left out, and is 0 then; below 0 it is a niche.
 * Example: a window from 1000, 1200 wide, 1050 up, 1000 high: x 1000–2200, z 1050–2050.
 */
export function buildFeature({
  entries,
  common,
}: FeatureInput):
  | { reading: Reading; problem: null }
  | { reading: null; problem: Problem & { field: string } } {
  const values: Record<string, number> = {};
  const texts: string[] = [];
  for (const { name, label, kind, isOptional } of featureFields) {
    const entry = entries[name];
    if (isOptional && (!entry || isEmptyEntry(entry))) continue;
    const { value, problems } = entry
      ? entryValue(entry, kind)
      : { value: null, problems: [problem('nothing-typed', `Type the ${label}.`)] };
    if (value === null) {
      const [first = problem('nothing-typed', `Type the ${label}.`)] = problems;
      return { reading: null, problem: { ...first, field: name } };
    }
    values[name] = value;
    texts.push(entry ? entryText(entry) : '');
  }
  const { x0 = 0, width = 0, z0 = 0, height = 0, projection = 0 } = values;
  const reading: Reading = {
    ...common,
    kind: 'feature',
    typed: texts.join(' / ').slice(0, 80),
    x0Mm: x0,
    x1Mm: x0 + width,
    z0Mm: z0,
    z1Mm: z0 + height,
    projectionMm: projection,
    note: '',
  };
  return { reading, problem: null };
}
