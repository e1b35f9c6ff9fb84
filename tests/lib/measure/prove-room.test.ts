import { describe, expect, test } from 'vitest';
import { fitRules } from '@/lib/contracts/shop-rules';
import { fitRoom } from '@/lib/measure/fit-room';
import { proveRoom } from '@/lib/measure/prove-room';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { sampleRun } from './sample-runs';
import { bookOf, type TrueRoom } from './true-room';

const rules = fitRules.parse(defaultShopRules('UK').fit);
const room: TrueRoom = {
  closed: true,
  zRefMm: 910,
  floor: () => 0,
  walls: [
    { name: 'A', lengthMm: 3_004, cornerDeg: 89.7, lean: 0.003, bowMm: 2 },
    { name: 'B', lengthMm: 2_398, cornerDeg: 90.4, lean: -0.002, bowMm: -1 },
    { name: 'C', lengthMm: 2_995, cornerDeg: 89.9, lean: 0.001, bowMm: 3 },
    { name: 'D', lengthMm: 2_401, cornerDeg: 90, lean: 0, bowMm: 0 },
  ],
};

describe('proving a room before leaving', () => {
  test('a room proved on the phone is the room that the office fits', () => {
    const book = bookOf(room, { diagonals: [[0, 2]], noiseMm: 0.4, seed: 3 });
    const runs = [sampleRun(1, 0)];
    const proved = proveRoom(book, runs, rules);
    const fit = fitRoom(book, runs, rules);
    expect(proved.closure).toEqual(fit.closure);
    expect(proved.corners).toEqual(fit.corners.map((corner) => ({ ...corner, verdicts: [] })));
    expect(proved.walls.map(({ length, columns }) => ({ length, columns }))).toEqual(
      fit.walls.map(({ length, columns }) => ({ length, columns })),
    );
  });

  test('a slip of the tape is named before the measurer leaves', () => {
    const book = bookOf(room, { diagonals: [[0, 2]], noiseMm: 0.4, seed: 3 });
    const slipped = book.readings.find(({ kind }) => kind === 'length');
    const readings = book.readings.map((reading) =>
      reading === slipped && reading.kind === 'length'
        ? { ...reading, valueMm: reading.valueMm + 100 }
        : reading,
    );
    const { suspect } = proveRoom({ ...book, readings }, [], rules).closure;
    expect(suspect?.readings[0]).toMatchObject({ readingIds: [slipped?.id], known: '100 mm' });
  });
});
