import type { Reading, ReadingOf, Touches } from '@/lib/contracts/readings';
import { type Problem, problem } from '@/lib/problem';
import type { LengthUnit } from '@/lib/units/brands';
import { entryValue } from './entry-value';
import { entryText, isEmptyEntry, type PadEntry } from './pad-entry';
import type { PadAsk, PadField } from './pad-fields';
import { askAtPlace } from './place-fields';

/** What every reading carries besides its values. */
export type ReadingCommon = {
  id: string;
  roomId: string;
  toolId: string;
  takenAt: string;
  unit: LengthUnit;
  touches: Touches;
  /** The reading that this one corrects. */
  replaces?: string;
};

/** What some kinds are told besides numbers. */
export type ReadingChoices = {
  /** The set-up that gaps, drops and rises belong to. */
  setUpId: string;
  setUpKind: ReadingOf<'face'>['setUpKind'];
  studAt: ReadingOf<'stud'>['at'];
  doorwayName: string;
};

/** Which field a problem belongs to, so that the pad can go there; null: to the whole. */
export type FieldProblem = Problem & { field: string | null };
export type BuiltReading =
  | { reading: Reading; problems: [] }
  | { reading: null; problems: [FieldProblem, ...FieldProblem[]] };

export type BuildInput = {
  ask: PadAsk;
  fields: PadField[];
  entries: Record<string, PadEntry | undefined>;
  common: ReadingCommon;
  choices: ReadingChoices;
};

/**
 * The reading that the typed entries make, or why they make none, naming the field.
 *
 * Edge: an optional field that is empty is left out. The record keeps the text as typed, "36 / 36 / 50 7/8".
 * Example: ask length of wall B at 910, entry 95 1/16 gives a length reading of 2414.5875 mm.
 * Problems: those of `entryValue`, with the field's name.
 */
export function buildReading({ ask, fields, entries, common, choices }: BuildInput): BuiltReading {
  const values: Record<string, number> = {};
  const texts: string[] = [];
  const problems: FieldProblem[] = [];
  for (const field of fields) {
    const entry = entries[field.name];
    if (field.isOptional && (!entry || isEmptyEntry(entry))) continue;
    if (!entry) {
      problems.push({ ...problem('nothing-typed', `Type the ${field.label}.`), field: field.name });
      continue;
    }
    const { value, problems: refusals } = entryValue(entry, field.kind);
    if (value === null) {
      problems.push(...refusals.map((refusal) => ({ ...refusal, field: field.name })));
      continue;
    }
    values[field.name] = value;
    texts.push(entryText(entry));
  }
  const [first, ...others] = problems;
  if (first) return { reading: null, problems: [first, ...others] };
  const typed = texts.join(' / ').slice(0, 80);
  return {
    reading: readingOf(askAtPlace(ask, values), fields, values, { ...common, typed }, choices),
    problems: [],
  };
}

function readingOf(
  ask: PadAsk,
  fields: readonly PadField[],
  values: Record<string, number>,
  common: ReadingCommon & { typed: string },
  { setUpId, setUpKind, studAt, doorwayName }: ReadingChoices,
): Reading {
  const value = (name: string) => values[name] ?? 0;
  switch (ask.kind) {
    case 'length': {
      const { wallId, zMm, yMm } = ask;
      return { ...common, kind: 'length', wallId, zMm, yMm, valueMm: value('value') };
    }
    case 'pieces': {
      const { wallId, zMm } = ask;
      const pieces = fields.filter((field) => field.kind === 'length');
      const piecesMm = pieces.flatMap(({ name }) => values[name] ?? []);
      return { ...common, kind: 'pieces', wallId, zMm, piecesMm };
    }
    case 'corner':
      return {
        ...common,
        kind: 'corner',
        cornerWallId: ask.cornerWallId,
        zMm: ask.zMm,
        by:
          values.angle === undefined
            ? {
                method: 'legs',
                legLeftMm: value('legLeft'),
                legRightMm: value('legRight'),
                diagonalMm: value('diagonal'),
                carriedPast: ask.carriedPast,
              }
            : { method: 'angle', angleDeg: values.angle },
      };
    case 'face': {
      const { wallId, xMm, zMm } = ask;
      return {
        ...common,
        kind: 'face',
        wallId,
        xMm,
        zMm,
        gapMm: value('gap'),
        setUpId,
        setUpKind,
      };
    }
    case 'floor': {
      const { wallId, xMm, yMm } = ask;
      const dropMm = value('drop');
      return { ...common, kind: 'floor', wallId, xMm, yMm, dropMm, setUpId };
    }
    case 'ceiling': {
      const { wallId, xMm, yMm } = ask;
      const riseMm = value('rise');
      return { ...common, kind: 'ceiling', wallId, xMm, yMm, riseMm, setUpId };
    }
    case 'diagonal': {
      const { fromCornerWallId, toCornerWallId, zMm } = ask;
      const valueMm = value('value');
      return { ...common, kind: 'diagonal', fromCornerWallId, toCornerWallId, zMm, valueMm };
    }
    case 'width': {
      const { wallId, xMm, toWallId, zMm } = ask;
      return { ...common, kind: 'width', wallId, xMm, toWallId, zMm, valueMm: value('value') };
    }
    case 'stud':
      return { ...common, kind: 'stud', wallId: ask.wallId, xMm: value('x'), at: studAt };
    case 'doorway':
      return {
        ...common,
        kind: 'doorway',
        name: doorwayName,
        clearWidthMm: value('clearWidth'),
        clearHeightMm: value('clearHeight'),
        ...(values.passageWidth === undefined ? {} : { passageWidthMm: values.passageWidth }),
      };
  }
}
