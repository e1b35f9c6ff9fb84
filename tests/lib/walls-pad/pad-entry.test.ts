import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { entryValue } from '@/lib/walls-pad/entry-value';
import {
  emptyEntry,
  entryOfAngle,
  entryOfLength,
  entryText,
  isEmptyEntry,
  type PadEntry,
  type PadKey,
  type PadUnit,
  pressKey,
  pressTick,
} from '@/lib/walls-pad/pad-entry';
import { nudged, tapeTicks } from '@/lib/walls-pad/tape-ticks';

const keys: PadKey[] = [
  ...('0123456789'.split('') as PadKey[]),
  'ft',
  'point',
  'sign',
  'back',
  'clear',
];
const typed = (unit: PadUnit, pressed: (PadKey | number)[]) =>
  pressed.reduce<PadEntry>(
    (entry, key) => (typeof key === 'number' ? pressTick(entry, key) : pressKey(entry, key)),
    emptyEntry(unit),
  );

describe('typing on the pad', () => {
  it.each<[PadUnit, (PadKey | number)[], string]>([
    ['in', ['9', '5'], '95'],
    ['in', ['9', '5', 4], '95 1/16'],
    ['in', [4, '9', '5'], '95 1/16'],
    ['in', ['9', '5', 32, 24], '95 3/8'],
    ['in', [8], '1/8'],
    ['in', ['7', 'ft', '1', '1', 4], `7' 11 1/16"`],
    ['in', ['8', 'ft'], `8'`],
    ['in', ['8', 'ft', 32], `8' 1/2"`],
    ['in', ['9', '5', 4, 'back'], '95'],
    ['in', ['9', '5', 'back'], '9'],
    ['in', ['7', 'ft', '1', 'back', 'back'], '7'],
    ['in', ['9', '5', 4, 'clear'], ''],
    ['in', ['sign', '1', 8], '-1 1/8'],
    ['in', ['0', '7'], '7'],
    ['in', ['point', '5'], '5'],
    ['mm', ['2', '4', '1', '3', 'point', '5'], '2413.5'],
    ['mm', ['2', '4', '1', '3', 'point'], '2413'],
    ['mm', ['point', '5', '5'], '0.5'],
    ['mm', ['1', 'ft', '2'], '12'],
    ['mm', ['1', 32], '1'],
    ['deg', ['8', '9', 'point', '7', '5', '9'], '89.75'],
  ])('in %s, %j reads "%s"', (unit, pressed, text) => {
    expect(entryText(typed(unit, pressed))).toBe(text);
  });

  it('has room for the longest wall and no more', () => {
    expect(entryText(typed('mm', [...'1234567'] as PadKey[]))).toBe('12345');
    expect(entryText(typed('in', [...'12345'] as PadKey[]))).toBe('1234');
  });

  it('gives back what was there, key by key, down to nothing', () => {
    fc.assert(
      fc.property(
        fc.constantFrom<PadUnit>('in', 'mm', 'deg'),
        fc.array(fc.oneof(fc.constantFrom(...keys), fc.integer({ min: 0, max: 63 })), {
          maxLength: 12,
        }),
        (unit, pressed) => {
          let entry = typed(unit, pressed);
          for (let back = 0; back < 20; back += 1) entry = pressKey(entry, 'back');
          expect(entry).toEqual(emptyEntry(unit));
        },
      ),
    );
  });

  it('always reads as a finite value or as words, whatever is pressed', () => {
    fc.assert(
      fc.property(
        fc.constantFrom<PadUnit>('in', 'mm', 'deg'),
        fc.array(fc.oneof(fc.constantFrom(...keys), fc.integer({ min: -9, max: 99 }))),
        (unit, pressed) => {
          const kind = unit === 'deg' ? 'angle' : 'length';
          const { value, problems } = entryValue(typed(unit, pressed), kind);
          if (value === null) expect(problems[0]?.message).toMatch(/\w/);
          else expect(Number.isFinite(value)).toBe(true);
        },
      ),
    );
  });

  it('shows a known length so that it reads the same', () => {
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 20_000 }), fc.boolean(), (count, isInches) => {
        const mm = isInches ? (count * 25.4) / 64 : count / 10;
        const entry = entryOfLength(mm, isInches ? 'in' : 'mm');
        expect(entryValue(entry, 'gap').value ?? mm).toBeCloseTo(mm, 6);
      }),
    );
  });

  it('shows a known angle so that it reads the same', () => {
    expect(entryText(entryOfAngle(89.754))).toBe('89.75');
  });
});

describe('entryValue', () => {
  it.each([
    ['95 1/16', typed('in', ['9', '5', 4]), 2_414.5875],
    ["7' 11 1/16", typed('in', ['7', 'ft', '1', '1', 4]), 2_414.5875],
    ['2413.5 mm', typed('mm', ['2', '4', '1', '3', 'point', '5']), 2_413.5],
  ])('reads %s', (_, entry, mm) => {
    expect(entryValue(entry, 'length').value).toBeCloseTo(mm, 9);
  });

  it('asks about millimetres typed on an inch pad', () => {
    const { value, problems } = entryValue(typed('in', ['8', '7', '6']), 'length');
    expect(value).toBeNull();
    expect(problems[0]?.message).toContain('touch in to change the unit');
  });

  it('takes the same length when the feet were typed', () => {
    expect(entryValue(typed('in', ['7', '3', 'ft']), 'length').value).toBeCloseTo(22_250.4, 6);
  });

  it('refuses twelve inches beside feet, in words', () => {
    const { problems } = entryValue(typed('in', ['7', 'ft', '1', '2']), 'length');
    expect(problems[0]?.code).toBe('inches-past-twelve');
  });

  it('refuses an empty entry', () => {
    expect(isEmptyEntry(emptyEntry('in'))).toBe(true);
    expect(entryValue(emptyEntry('in'), 'length').problems[0]?.code).toBe('nothing-typed');
  });

  it.each(['0', '360', '999'])('refuses a corner of %s°', (text) => {
    const entry = typed('deg', [...text] as PadKey[]);
    expect(entryValue(entry, 'angle').problems[0]?.code).toBe('angle-out-of-range');
  });
});

describe('tapeTicks', () => {
  it('lays eighths and the sixteenths between them', () => {
    const { eighths, sixteenths, nudge } = tapeTicks(25.4 / 16);
    expect(eighths.map(({ numerator, denominator }) => `${numerator}/${denominator}`)).toEqual([
      '0/1',
      '1/8',
      '1/4',
      '3/8',
      '1/2',
      '5/8',
      '3/4',
      '7/8',
    ]);
    expect(sixteenths.map(({ numerator }) => numerator)).toEqual([1, 3, 5, 7, 9, 11, 13, 15]);
    expect(nudge).toBeNull();
  });

  it.each([
    [25.4 / 8, 0, null],
    [25.4 / 32, 8, 2],
    [25.4 / 64, 8, 1],
    [1, 8, null],
  ])('for a step of %f mm shows %i sixteenths and nudges by %j', (step, count, nudge) => {
    expect(tapeTicks(step)).toMatchObject({ nudge });
    expect(tapeTicks(step).sixteenths).toHaveLength(count);
  });

  it('stays on the inch', () => {
    expect([nudged(0, -2), nudged(63, 2), nudged(8, 2)]).toEqual([0, 63, 10]);
  });
});
