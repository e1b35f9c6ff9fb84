import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Reading } from '@/lib/contracts/readings';
import { judgedBy, worstOf } from '@/lib/walls-pad/pad-verdict';
import { verdictOf } from '@/lib/walls-pad/verdict-of';
import {
  exampleBook,
  exampleLength,
  exampleLevel,
  id,
  inchRules,
  metricRules,
  wallIds,
} from '@/tests/help/wall-book-examples';

const say = (reading: Reading, before: Reading[] = [], rules = metricRules) =>
  verdictOf(reading, { book: exampleBook(before), runs: [], rules });
const {
  kind: _kind,
  wallId: _wall,
  zMm: _z,
  yMm: _y,
  valueMm: _value,
  ...common
} = exampleLength(1);
const corner = (diagonalMm: number): Reading => ({
  ...common,
  id: id(700),
  kind: 'corner',
  cornerWallId: wallIds.B,
  zMm: 910,
  by: { method: 'legs', legLeftMm: 900, legRightMm: 1_200, diagonalMm, carriedPast: false },
});
const gap = (number: number, xMm: number, zMm: number, gapMm: number): Reading => ({
  ...common,
  id: id(800 + number),
  toolId: exampleLevel.id,
  kind: 'face',
  wallId: wallIds.A,
  xMm,
  zMm,
  gapMm,
  setUpId: id(600),
  setUpKind: 'plumb-level',
});
const drop = (number: number, dropMm: number): Reading => ({
  ...common,
  id: id(850 + number),
  kind: 'floor',
  wallId: wallIds.A,
  xMm: number * 600,
  yMm: 30,
  dropMm,
  setUpId: id(600),
});

describe('every verdict of the pad', () => {
  it('names the rule that judged it, whatever was read', () => {
    const judgedReadings: [Reading, Reading[]][] = [
      [corner(1_502), []],
      [gap(3, 2_000, 910, 12), [gap(1, 0, 910, 3), gap(2, 1_000, 910, 0)]],
      [gap(2, 0, 2_000, 9), [gap(1, 0, 100, 0)]],
      [drop(2, 1_212), [drop(1, 1_200)]],
      [{ ...exampleLength(2), valueMm: 2_000, zMm: 910 }, [{ ...exampleLength(1), zMm: 910 }]],
      [{ ...exampleLength(2), valueMm: 2_000, zMm: 100 }, [{ ...exampleLength(1), zMm: 910 }]],
    ];
    for (const ruleSet of ['shop', 'din-18202', 'nhbc-2020', 'us-residential', 'awi-0620-custom']) {
      for (const [reading, before] of judgedReadings) {
        const verdict = say(reading, before, { ...metricRules, ruleSet });
        expect(verdict?.kind).not.toBe('note');
        expect(verdict?.by?.short).toMatch(/: (at most|repeats within) .*\d/);
        expect(verdict?.by?.details.map(({ label }) => label)).toEqual(
          expect.arrayContaining(['Limit', 'Source', 'What to do']),
        );
      }
    }
  });

  it('judges a wall by the straightedge that its rule lays on it, as the fit does', () => {
    const row = [gap(1, 0, 910, 4), gap(2, 1_000, 910, 0), gap(3, 2_000, 910, 4)];
    const long = gap(4, 6_000, 910, 4);
    const words = (ruleSet: string) => say(long, row, { ...metricRules, ruleSet })?.by?.short;
    expect(words('nhbc-2020')).toContain('at most 3 mm over 2000 mm');
    expect(words('din-18202')).toContain('table 3, row 6');
  });
});

describe('judgedBy', () => {
  it.each([
    [4, 0.5, 'within'],
    [5, 0.5, 'close'],
    [4.5, 1.6, 'close'],
    [6, 0, 'close'],
    [6.1, 0.5, 'over'],
  ])('says of %f ± %f against 6: %s', (size, expanded, kind) => {
    const own = { ...metricRules, plumbFlagMm: 6 };
    expect(judgedBy(own, 'wall-plumb', { value: size, U: expanded }, 2_400).kind).toBe(kind);
  });

  it('asks the published rule set that the shop has picked, and names it', () => {
    const nhbc = { ...metricRules, ruleSet: 'nhbc-2020' };
    const judged = judgedBy(nhbc, 'wall-plumb', { value: 7, U: 0.5 }, 2_400);
    expect(judged.kind).toBe('close');
    expect(judged.by?.short).toBe('NHBC Standards 2020, 9.1.3: at most 8 mm over 2400 mm');
    const din = judgedBy(
      { ...metricRules, ruleSet: 'din-18202' },
      'wall-plumb',
      { value: 9, U: 1 },
      2_400,
    );
    expect(din).toMatchObject({
      kind: 'over',
      by: { short: 'DIN 18202, table 2: at most 8 mm over 2400 mm' },
    });
  });

  it('lets the worst of several verdicts rule and says all', () => {
    expect(
      worstOf([
        { kind: 'within', words: 'Straight.' },
        { kind: 'over', words: 'Leans.' },
      ]),
    ).toEqual({ kind: 'over', words: 'Leans. Straight.' });
  });
});

describe('the verdict on a length', () => {
  it('says that it is the first, and how sure', () => {
    expect(say(exampleLength(1))).toEqual({ kind: 'note', words: 'First on this wall, ± 2 mm.' });
  });

  it('speaks in inches to an inch shop', () => {
    expect(say(exampleLength(1), [], inchRules)?.words).toBe('First on this wall, ± 1/8".');
  });

  it('wonders at a first reading far from the sketch', () => {
    expect(say(exampleLength(1, { valueMm: 4_500 }))?.words).toContain(
      '500 mm longer than the sketch',
    );
  });

  it('agrees with a second reading of the same height', () => {
    expect(say(exampleLength(2, { valueMm: 4_001 }), [exampleLength(1)])).toMatchObject({
      kind: 'within',
      words: expect.stringContaining('Agrees'),
    });
  });

  it('asks for a third reading where two disagree', () => {
    expect(say(exampleLength(2, { valueMm: 4_006 }), [exampleLength(1)])).toMatchObject({
      kind: 'over',
      words: expect.stringContaining('Read it once more'),
    });
  });

  it('does not hold a correction against what it corrects', () => {
    const before = exampleLength(1, { valueMm: 4_300 });
    expect(say(exampleLength(2, { replaces: before.id }), [before])?.kind).toBe('note');
  });

  it('says how the ends lean from the height below', () => {
    const floor = exampleLength(1, { zMm: 100, valueMm: 3_995 });
    expect(say(exampleLength(2), [floor])).toMatchObject({
      kind: 'close',
      words: '5 mm longer than at 100 mm up ± 2 mm: the ends lean apart going up.',
    });
    const upper = exampleLength(3, { zMm: 1_450, valueMm: 4_000 });
    expect(say(exampleLength(4, { zMm: 100, valueMm: 4_009 }), [upper])).toMatchObject({
      kind: 'over',
      words: expect.stringContaining('lean together going up'),
    });
  });

  it('asks whether an inch was misread where the ends would lean by just that much', () => {
    const floor = exampleLength(1, { zMm: 100, valueMm: 4_000 });
    expect(say(exampleLength(2, { valueMm: 4_025 }), [floor])?.words).toContain(
      'lean apart going up, or one of the two is 1 in misread. Read it once more.',
    );
    expect(say(exampleLength(2, { valueMm: 4_019 }), [floor])?.words).toMatch(/going up\.$/);
  });

  it('calls a difference inside its uncertainty the same', () => {
    const floor = exampleLength(1, { zMm: 100, valueMm: 3_999.5 });
    expect(say(exampleLength(2), [floor])?.words).toBe(
      'The same as at 100 mm up, within the reading.',
    );
  });
});

describe('the verdict on a corner', () => {
  it('says true within the reading', () => {
    expect(say(corner(1_500))).toMatchObject({
      words: expect.stringContaining('True within the reading: 90.0°'),
    });
  });

  it('says what a closed corner takes over the depth', () => {
    // 900, 1200, 1485: acos((810000 + 1440000 − 2205225) / 2160000) = 88.812°; 600·tan(1.188°) = 12.4.
    expect(say(corner(1_485))).toMatchObject({
      kind: 'over',
      words: expect.stringMatching(/^Closed: takes 12 mm ± \d mm over 600 mm\. 88\.8° ± 0\.\d°\.$/),
    });
  });

  it('says what an open corner gives', () => {
    expect(say(corner(1_515))?.words).toMatch(/^Open: gives 13 mm/);
  });

  it('says in words that three sides make no corner', () => {
    expect(say(corner(2_400))).toMatchObject({
      kind: 'over',
      words: expect.stringContaining('longer than both legs'),
    });
  });
});

describe('the verdict on a face', () => {
  it('waits for more gaps', () => {
    expect(say(gap(1, 100, 910, 5))).toEqual({ kind: 'note', words: 'First gap of this set-up.' });
  });

  it('sees a bulge along the row', () => {
    const before = [gap(1, 100, 910, 8), gap(2, 1_000, 910, 0)];
    expect(say(gap(3, 1_900, 910, 8), before)).toMatchObject({
      kind: 'over',
      words: expect.stringMatching(/^Bulges 8 mm/),
    });
  });

  it('sees a lean up the column', () => {
    expect(say(gap(2, 100, 1_450, 2), [gap(1, 100, 100, 10)])).toMatchObject({
      kind: 'over',
      words: expect.stringMatching(/^Leans into the room 8 mm ± 2 mm over 1350 mm\./),
    });
  });

  it('says nothing of plumb by a straightedge', () => {
    const straightedge = (face: Reading): Reading =>
      face.kind === 'face' ? { ...face, setUpKind: 'straightedge' } : face;
    const before = [straightedge(gap(1, 100, 100, 10))];
    expect(say(straightedge(gap(2, 100, 1_450, 2)), before)?.words).toBe('2 gaps in this set-up.');
  });
});

describe('the verdict on a floor', () => {
  it('names the high point so far and the fall', () => {
    expect(say(drop(2, 1_195), [drop(1, 1_200)])).toMatchObject({
      kind: 'within',
      words: expect.stringMatching(/^High point so far; the floor falls 5 mm/),
    });
  });

  it('asks for a decision where the fall is past what legs take', () => {
    expect(say(drop(2, 1_225), [drop(1, 1_200)])).toMatchObject({
      kind: 'over',
      words: expect.stringContaining('The office must decide'),
    });
  });

  it('adds drop and rise to the clear height', () => {
    const rise: Reading = {
      ...common,
      id: id(900),
      kind: 'ceiling',
      wallId: wallIds.A,
      xMm: 600,
      yMm: 30,
      riseMm: 1_232,
      setUpId: id(600),
    };
    expect(say(rise, [drop(1, 1_200)])?.words).toMatch(/^Clear height 2432 mm/);
  });
});

describe('the verdict across the room', () => {
  const square: Reading[] = [
    exampleLength(1, { valueMm: 4_000 }),
    exampleLength(2, { wallId: wallIds.B, valueMm: 3_000 }),
    corner(1_500),
  ];
  const diagonal = (valueMm: number): Reading => ({
    ...common,
    id: id(950),
    kind: 'diagonal',
    fromCornerWallId: wallIds.A,
    toCornerWallId: wallIds.C,
    zMm: 910,
    valueMm,
  });

  it('agrees with walls and corner', () => {
    expect(say(diagonal(5_002), square)).toMatchObject({
      kind: 'within',
      words: expect.stringContaining('walls and corners give 5000 mm'),
    });
  });

  it('says that something was misread', () => {
    expect(say(diagonal(5_025.4), square)).toMatchObject({
      kind: 'over',
      words: expect.stringContaining('25 mm more than walls and corners give'),
    });
  });

  it('waits for walls and corners', () => {
    expect(say(diagonal(5_000))?.kind).toBe('note');
  });
});

describe('the verdict on a stud', () => {
  const stud = (number: number, xMm: number): Reading => ({
    ...common,
    id: id(970 + number),
    kind: 'stud',
    wallId: wallIds.A,
    xMm,
    at: 'centre',
  });

  it('knows a spacing', () => {
    expect(say(stud(2, 1_005), [stud(1, 400)])?.words).toBe(
      '605 mm from the nearest: on 600 mm centres.',
    );
  });

  it('knows none in an odd one', () => {
    expect(say(stud(2, 700), [stud(1, 400)])?.kind).toBe('note');
  });
});

describe('every verdict', () => {
  it('says something finite of any readings', () => {
    const size = fc.double({ min: 0, max: 20_000, noNaN: true });
    fc.assert(
      fc.property(size, size, size, (a, b, c) => {
        const before = [exampleLength(1, { valueMm: a }), gap(1, 100, 910, 3), drop(1, b)];
        const readings = [exampleLength(2, { valueMm: c, zMm: 100 }), corner(c), drop(2, a)];
        for (const reading of readings) {
          const verdict = say(reading, before);
          expect(verdict?.words).toMatch(/\w/);
          expect(verdict?.words).not.toMatch(/NaN|Infinity|undefined/);
        }
      }),
    );
  });
});
