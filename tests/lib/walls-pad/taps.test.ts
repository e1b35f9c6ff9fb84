import { describe, expect, it } from 'vitest';
import { planRoom } from '@/db/seed/demo-rooms';
import { measureRoom } from '@/db/seed/measure-room';
import { seededRandom } from '@/db/seed/seeded-random';
import type { Reading } from '@/lib/contracts/readings';
import type { Tool, WallBook } from '@/lib/contracts/wall-book';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { askOfReading } from '@/lib/walls-pad/ask-of-reading';
import { mayGoOn } from '@/lib/walls-pad/go-on';
import { emptyEntry, entryOfLength, pressTick } from '@/lib/walls-pad/pad-entry';
import { sameStart } from '@/lib/walls-pad/same-start';
import { exampleLength, id, wallIds } from '@/tests/help/wall-book-examples';

const rules = defaultShopRules('US').fit;
const tape: Tool = {
  id: id(900),
  name: 'Tape',
  spec: { kind: 'tape', accuracyClass: 'II', stepMm: 25.4 / 16, repeatabilityMm: 0.5 },
};
const level: Tool = {
  id: id(901),
  name: 'Level',
  spec: { kind: 'level', mpeMmPerM: 0.5, stepMm: 0.5, repeatabilityMm: 0.5 },
};

/** The demo's room of six walls, read as it is asked for. */
function sixWalls(): { book: WallBook; readings: Reading[] } {
  const { room, runs, truth } = planRoom('misread', rules, seededRandom(1));
  const readings = measureRoom({
    truth,
    room,
    runs,
    rules,
    tools: { tape, level },
    random: seededRandom(1871),
    startedAt: new Date('2026-05-12T14:00:00Z'),
  });
  return { book: { room, readings: [], tools: [tape, level] }, readings };
}

/** The figure that a question of one field is answered with; a corner's legs stand there already. */
function figureOf(reading: Reading): number | null {
  switch (reading.kind) {
    case 'length':
    case 'diagonal':
    case 'width':
      return reading.valueMm;
    case 'corner':
      return reading.by.method === 'legs' ? reading.by.diagonalMm : null;
    case 'face':
      return reading.gapMm;
    case 'floor':
      return reading.dropMm;
    case 'ceiling':
      return reading.riseMm;
    case 'stud':
      return reading.xMm;
    default:
      return null;
  }
}

function tapsFor(reading: Reading, before: Reading[], book: WallBook) {
  const mm = figureOf(reading);
  const asked = askOfReading(reading, book.room);
  if (mm === null || !asked) return null;
  // The corner is asked for with the legs that the plan gives.
  const ask =
    asked.kind === 'corner' && reading.kind === 'corner' && reading.by.method === 'legs'
      ? { ...asked, legMm: reading.by.legRightMm }
      : asked;
  const { whole, sixtyFourths } = entryOfLength(Math.round(mm / rules.stepMm) * rules.stepMm, 'in');
  const digits = whole === '0' ? 0 : whole.length;
  const setUpId = 'setUpId' in reading ? reading.setUpId : null;
  const start = sameStart(ask, { book: { ...book, readings: before }, setUpId, unit: 'in' });
  const begins = start?.shown === whole ? 1 : digits;
  return {
    // Digits, a tick where there is a fraction, next.
    plain: Math.max(1, digits + (sixtyFourths > 0 ? 1 : 0)) + 1,
    // What was the same beside it in one touch, a tick always; it goes on by itself.
    now: begins + 1,
  };
}

describe('the taps of a kitchen of six walls', () => {
  it('are a third fewer where the same inches are offered and the tick goes on by itself', () => {
    const { book, readings } = sixWalls();
    const counted = readings.flatMap(
      (reading, index) => tapsFor(reading, readings.slice(0, index), book) ?? [],
    );
    const plain = counted.reduce((sum, { plain: taps }) => sum + taps, 0);
    const now = counted.reduce((sum, { now: taps }) => sum + taps, 0);
    expect(counted.length).toBeGreaterThan(60);
    expect(now / plain).toBeLessThan(0.67);
  });
});

describe('what a figure begins with', () => {
  const at = (zMm: number, valueMm: number) =>
    exampleLength(1, { zMm, valueMm, wallId: wallIds.A });
  const ask = { kind: 'length', wallId: wallIds.A, zMm: 914.4, yMm: 0, nominalMm: 0 } as const;
  const given = (readings: Reading[], unit: 'in' | 'mm') =>
    sameStart(ask, {
      book: { ...sixWalls().book, readings },
      setUpId: null,
      unit,
    });

  it('is the whole inches of the wall at another height, never its fraction', () => {
    const start = given([at(100, 2_414.5875)], 'in');
    expect(start).toMatchObject({ shown: '95', entry: { whole: '95', sixtyFourths: 0 } });
  });

  it('is all but the last two digits in millimetres', () => {
    expect(given([at(100, 2_414)], 'mm')?.shown).toBe('24');
    expect(given([at(100, 87)], 'mm')).toBeNull();
  });

  it('is nothing where the same height was read before: that is read afresh', () => {
    expect(given([at(914.4, 2_414)], 'in')).toBeNull();
    expect(given([], 'in')).toBeNull();
  });
});

describe('going on by itself', () => {
  const typed = pressTick({ ...emptyEntry('in'), whole: '95' }, 4);
  it('waits where the value is refused or over its rule', () => {
    expect(mayGoOn(typed, 'within')).toBe(true);
    expect(mayGoOn(typed, 'why')).toBe(true);
    expect(mayGoOn(typed, 'over')).toBe(false);
    expect(mayGoOn(typed, 'refused')).toBe(false);
  });

  it('waits for the inches after feet, and in millimetres for the next key', () => {
    expect(mayGoOn({ ...emptyEntry('in'), feet: '7' }, 'within')).toBe(false);
    expect(mayGoOn({ ...emptyEntry('mm'), whole: '2414' }, 'within')).toBe(false);
  });
});
