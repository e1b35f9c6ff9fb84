import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { reading as readingSchema } from '@/lib/contracts/readings';
import { askOfReading, entriesOfReading } from '@/lib/walls-pad/ask-of-reading';
import {
  buildReading,
  type ReadingChoices,
  type ReadingCommon,
} from '@/lib/walls-pad/build-reading';
import { buildFeature } from '@/lib/walls-pad/feature-fields';
import { emptyEntry, entryOfLength } from '@/lib/walls-pad/pad-entry';
import { type PadAsk, padFields } from '@/lib/walls-pad/pad-fields';
import { placeFields } from '@/lib/walls-pad/place-fields';
import { refusalOf } from '@/lib/walls-pad/verdict-of';
import {
  exampleBook,
  exampleRoom,
  exampleRoomId,
  exampleTape,
  id,
  metricRules,
  wallIds,
} from '@/tests/help/wall-book-examples';

const common: ReadingCommon = {
  id: id(500),
  roomId: exampleRoomId,
  toolId: exampleTape.id,
  takenAt: '2026-12-01T09:00:00.000Z',
  unit: 'mm',
  touches: 'plaster',
};
const choices: ReadingChoices = {
  setUpId: id(600),
  setUpKind: 'plumb-level',
  studAt: 'centre',
  doorwayName: 'Back door',
};
const asks: PadAsk[] = [
  { kind: 'length', wallId: wallIds.A, zMm: 910, yMm: 0, nominalMm: 4_000 },
  {
    kind: 'corner',
    cornerWallId: wallIds.B,
    zMm: 910,
    nominalDeg: 90,
    legMm: 900,
    carriedPast: false,
  },
  {
    kind: 'face',
    wallId: wallIds.A,
    xMm: 600,
    zMm: 910,
    setUpKind: 'plumb-level',
    setUpGroup: 'face',
    setUpId: null,
  },
  { kind: 'floor', wallId: wallIds.A, xMm: 600, yMm: 30, setUpGroup: 'level', setUpId: null },
  { kind: 'ceiling', wallId: wallIds.A, xMm: 600, yMm: 600, setUpGroup: 'level', setUpId: null },
  { kind: 'diagonal', fromCornerWallId: wallIds.A, toCornerWallId: wallIds.C, zMm: 910 },
  { kind: 'width', wallId: wallIds.A, xMm: 400, toWallId: wallIds.C, zMm: 910 },
  { kind: 'stud', wallId: wallIds.A, nth: 1 },
  { kind: 'doorway' },
];
const build = (ask: PadAsk, mm: (name: string) => number | null) => {
  const fields = padFields(ask);
  const entries = Object.fromEntries(
    fields.map(({ name }) => {
      const value = mm(name);
      return [name, value === null ? emptyEntry('mm') : entryOfLength(value, 'mm')];
    }),
  );
  return buildReading({ ask, fields, entries, common, choices });
};

describe('buildReading', () => {
  it.each(asks.map((ask) => [ask.kind, ask] as const))(
    'makes a %s that the office understands',
    (kind, ask) => {
      const { reading } = build(ask, () => 250);
      expect(readingSchema.parse(reading)).toEqual(reading);
      expect(reading).toMatchObject({ kind, typed: expect.stringContaining('250') });
    },
  );

  it('keeps the text as typed', () => {
    const ask = asks[1] as PadAsk;
    const entries = {
      legLeft: entryOfLength(914.4, 'in'),
      legRight: entryOfLength(914.4, 'in'),
      diagonal: entryOfLength(1_293.8125, 'in'),
    };
    const built = buildReading({ ask, fields: padFields(ask), entries, common, choices });
    expect(built.reading?.typed).toBe('36 / 36 / 50 15/16');
  });

  it('leaves an optional value out when it was not typed', () => {
    const { reading } = build({ kind: 'doorway' }, (name) =>
      name === 'passageWidth' ? null : 800,
    );
    expect(reading).toMatchObject({ kind: 'doorway', clearWidthMm: 800, name: 'Back door' });
    expect(reading).not.toHaveProperty('passageWidthMm');
  });

  it('names the field that is missing', () => {
    const { reading, problems } = build(asks[1] as PadAsk, (name) =>
      name === 'diagonal' ? null : 900,
    );
    expect(reading).toBeNull();
    expect(problems).toMatchObject([{ field: 'diagonal', code: 'nothing-typed' }]);
  });

  it('puts a reading that nobody asked for where its places were typed', () => {
    const ask = asks[2] as PadAsk;
    const fields = [...placeFields(ask), ...padFields(ask)];
    const entries = {
      placeX: entryOfLength(1_234, 'mm'),
      placeZ: entryOfLength(1_450, 'mm'),
      gap: entryOfLength(3.5, 'mm'),
    };
    expect(buildReading({ ask, fields, entries, common, choices }).reading).toMatchObject({
      xMm: 1_234,
      zMm: 1_450,
      gapMm: 3.5,
    });
  });

  it('gives back, from any reading, the question and the entries that make it again', () => {
    fc.assert(
      fc.property(fc.constantFrom(...asks), fc.integer({ min: 20, max: 250 }), (ask, value) => {
        const { reading } = build(ask, () => value);
        if (!reading) throw new Error('not built');
        const again = askOfReading(reading, exampleRoom);
        if (!again) throw new Error('no question');
        const rebuilt = buildReading({
          ask: again,
          fields: padFields(again),
          entries: entriesOfReading(reading, 'mm'),
          common,
          choices,
        });
        expect(rebuilt.reading).toEqual(reading);
      }),
    );
  });
});

describe('refusalOf', () => {
  const input = { book: exampleBook(), runs: [], rules: metricRules };

  it('refuses a diagonal longer than the legs together, in words', () => {
    const { reading } = build(asks[1] as PadAsk, (name) => (name === 'diagonal' ? 2_500 : 900));
    expect(reading && refusalOf(reading, input)?.message).toContain(
      'longer than both legs together',
    );
  });

  it('lets a corner pass that can be', () => {
    const { reading } = build(asks[1] as PadAsk, (name) => (name === 'diagonal' ? 1_273 : 900));
    expect(reading && refusalOf(reading, input)).toBeNull();
  });
});

describe('buildFeature', () => {
  const entries = {
    x0: entryOfLength(1_000, 'mm'),
    width: entryOfLength(1_200, 'mm'),
    z0: entryOfLength(1_050, 'mm'),
    height: entryOfLength(1_000, 'mm'),
  };
  const own = { ...common, wallId: wallIds.A, feature: 'window', swing: 'in-left' } as const;

  it('places a window on its wall', () => {
    const { reading } = buildFeature({ entries, common: own });
    expect(readingSchema.parse(reading)).toEqual(reading);
    expect(reading).toMatchObject({
      x0Mm: 1_000,
      x1Mm: 2_200,
      z0Mm: 1_050,
      z1Mm: 2_050,
      projectionMm: 0,
      swing: 'in-left',
      typed: '1000 / 1200 / 1050 / 1000',
    });
  });

  it('takes a niche as standing out by less than nothing', () => {
    const projection = { ...entryOfLength(80, 'mm'), isNegative: true };
    const { reading } = buildFeature({ entries: { ...entries, projection }, common: own });
    expect(reading).toMatchObject({ projectionMm: -80 });
  });

  it('names the field that is missing', () => {
    const { problem } = buildFeature({ entries: { ...entries, z0: undefined }, common: own });
    expect(problem).toMatchObject({ field: 'z0', code: 'nothing-typed' });
  });
});
