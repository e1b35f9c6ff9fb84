import { describe, expect, it } from 'vitest';
import { type ReadingOf, reading as readingSchema } from '@/lib/contracts/readings';
import { asRead } from '@/lib/walls-pad/as-read';
import { askOfReading, entriesOfReading } from '@/lib/walls-pad/ask-of-reading';
import { buildReading } from '@/lib/walls-pad/build-reading';
import { freshDraft, nextField } from '@/lib/walls-pad/pad-draft';
import { emptyEntry, entryOfLength, type PadEntry } from '@/lib/walls-pad/pad-entry';
import { type PadAsk, padFields } from '@/lib/walls-pad/pad-fields';
import { piecesSoFar } from '@/lib/walls-pad/pieces-so-far';
import { readingWords } from '@/lib/walls-pad/reading-words';
import { verdictOf } from '@/lib/walls-pad/verdict-of';
import {
  exampleBook,
  exampleLength,
  exampleRoom,
  exampleRoomId,
  exampleTape,
  id,
  metricRules,
  wallIds,
} from '@/tests/help/wall-book-examples';

const ask: PadAsk = {
  kind: 'pieces',
  wallId: wallIds.A,
  zMm: 910,
  nominalMm: 4_000,
  stretches: ['piece to the window', 'window', 'piece to the corner'],
};
const typed = (...mm: number[]): Record<string, PadEntry> =>
  Object.fromEntries(mm.map((piece, i) => [`piece${i + 1}`, entryOfLength(piece, 'mm')]));
const common = {
  id: id(500),
  roomId: exampleRoomId,
  toolId: exampleTape.id,
  takenAt: '2026-12-01T09:00:00.000Z',
  unit: 'mm' as const,
  touches: 'board' as const,
};
const choices = {
  setUpId: id(600),
  setUpKind: 'plumb-level' as const,
  studAt: 'centre' as const,
  doorwayName: '',
};
const built = (entries: Record<string, PadEntry>) =>
  buildReading({ ask, fields: padFields(ask, 'legs', entries), entries, common, choices });
const pieces = (...piecesMm: number[]): ReadingOf<'pieces'> => ({
  ...common,
  typed: '',
  kind: 'pieces',
  wallId: wallIds.A,
  zMm: 910,
  piecesMm,
});

describe('a wall typed in pieces', () => {
  it('asks for each stretch by what ends it, and offers one more', () => {
    expect(padFields(ask).map(({ label }) => label)).toEqual([
      'piece to the window',
      'window',
      'piece to the corner',
      'one more',
    ]);
    expect(padFields(ask, 'legs', typed(1_200, 900, 900, 1_000)).map(({ label }) => label)).toEqual(
      ['piece to the window', 'window', 'piece to the corner', 'piece 4', 'one more'],
    );
  });

  it('goes from piece to piece and on after the last, without stopping at the one more', () => {
    const fields = padFields(ask);
    const draft = freshDraft('q', ask, fields, 'mm', 'legs');
    expect(draft.active).toBe('piece1');
    const last = { ...draft, active: 'piece3', entries: { ...draft.entries, ...typed(1, 2, 3) } };
    expect(nextField(fields, last)).toBeNull();
    expect(
      nextField(fields, { ...last, entries: { ...last.entries, piece2: emptyEntry('mm') } }),
    ).toBe('piece2');
  });

  it('says what the pieces make so far, beside the sketch', () => {
    const soFar = (...mm: number[]) => piecesSoFar(ask, padFields(ask), typed(...mm), metricRules);
    expect(soFar()).toBeNull();
    expect(soFar(1_210, 914)).toBe('2124 mm so far, of some 4000 mm on the sketch.');
  });

  it('is kept as one reading, with the texts as typed', () => {
    const { reading } = built(typed(1_210, 914, 1_876));
    expect(reading).toMatchObject({ kind: 'pieces', piecesMm: [1_210, 914, 1_876] });
    expect(reading?.typed).toBe('1210 / 914 / 1876');
    expect(readingSchema.parse(reading)).toEqual(reading);
  });

  it('is refused while a piece is missing, naming it', () => {
    const { problems } = built(typed(1_210, 914));
    expect(problems[0]).toMatchObject({
      field: 'piece3',
      message: 'Type the piece to the corner.',
    });
  });

  it('takes a fourth piece where the measurer had to mark once more', () => {
    expect(built(typed(1_210, 914, 900, 976)).reading).toMatchObject({
      piecesMm: [1_210, 914, 900, 976],
    });
  });

  it('comes back to the pad as it was typed, to be corrected', () => {
    const reading = pieces(1_210, 914, 1_876);
    const again = askOfReading(reading, exampleRoom);
    expect(again).toMatchObject({ stretches: ['piece 1', 'piece 2', 'piece 3'], nominalMm: 4_000 });
    expect(entriesOfReading(reading, 'mm')).toEqual(typed(1_210, 914, 1_876));
    expect(readingWords(reading, exampleRoom, metricRules)).toEqual({
      what: 'In 3 pieces, 910 mm up',
      value: '4000 mm',
    });
  });

  it('draws the wall as long as its pieces until the whole is read', () => {
    const drawn = (...readings: Parameters<typeof exampleBook>[0] & object) =>
      asRead(exampleBook(readings)).lengthMm.get(wallIds.A)?.value;
    expect(drawn(pieces(1_210, 914, 1_876))).toBe(4_000);
    expect(drawn(pieces(1_210, 914, 1_876), exampleLength(1, { valueMm: 4_004 }))).toBe(4_004);
  });
});

describe('what is said of pieces at once', () => {
  const say = (reading: Parameters<typeof verdictOf>[0], before: (typeof reading)[] = []) =>
    verdictOf(reading, { book: exampleBook(before), runs: [], rules: metricRules });

  it('adds them up', () => {
    expect(say(pieces(1_210, 914, 1_876))).toMatchObject({
      kind: 'note',
      words: expect.stringMatching(/^In all 4000 mm ± \d mm\.$/),
    });
  });

  it('holds them against the whole read before, by the shop’s rule', () => {
    const whole = exampleLength(1, { valueMm: 4_000 });
    expect(say(pieces(1_210, 914, 1_876), [whole])).toMatchObject({
      kind: 'within',
      words: expect.stringContaining('Pieces and whole agree'),
      by: { short: expect.stringContaining('3 mm') },
    });
    expect(say(pieces(1_210, 914, 1_880), [whole])).toMatchObject({
      kind: 'over',
      words: expect.stringMatching(
        /4 mm ± \d mm more than the whole\. Measure the pieces again\.$/,
      ),
    });
    expect(say(pieces(1_210, 914, 1_890), [whole])?.words).toContain(
      'No release until they add up',
    );
  });

  it('holds the whole against pieces read before it', () => {
    const verdict = say(exampleLength(2, { valueMm: 4_010 }), [pieces(1_210, 914, 1_876)]);
    expect(verdict).toMatchObject({ kind: 'over', words: expect.stringContaining('10 mm') });
    expect(verdict?.words).toContain('less than the whole');
  });

  it('is not troubled by pieces of another height', () => {
    const whole = exampleLength(1, { zMm: 100, valueMm: 3_990 });
    expect(say(pieces(1_210, 914, 1_876), [whole])?.kind).toBe('note');
  });
});
