import { describe, expect, it } from 'vitest';
import { asFound } from '@/lib/days/as-found';
import { type AsFoundAsk, asFoundAsks, asFoundReading } from '@/lib/days/as-found-asks';
import { releasedSheet } from '../../help/released-sheet';

const sheet = releasedSheet();
const asks = asFoundAsks(sheet);
const read = (ask: AsFoundAsk, value: number) =>
  asFoundReading(ask, {
    id: `00000000-0000-4000-9000-${String(Math.round(value * 10)).padStart(12, '0')}`,
    roomId: sheet.wallBook.room.id,
    takenAt: '2026-12-01T09:00:00.000Z',
    unit: 'in',
    typed: String(value),
    setUpId: '00000000-0000-4000-9000-0000000000aa',
    value,
  });
const corner = (name: string) => {
  const ask = asks.find((one) => one.kind === 'diagonal' && one.corner === name);
  if (ask?.kind !== 'diagonal') throw new Error(`corner ${name} is not asked`);
  return ask;
};
const drops = asks.filter((one) => one.kind === 'drop');

describe('a room read again before setting', () => {
  it('asks the corners that runs stand in, with the legs of the first reading, and the fall of the floor', () => {
    expect(asks.map(({ kind }) => kind)).toContain('diagonal');
    expect(drops.map(({ at }) => at)).toEqual(['high', 'low']);
    expect(asFoundAsks({ ...sheet, runs: [] }).filter(({ kind }) => kind !== 'drop')).toEqual([]);
  });

  it('says nothing when everything reads as it did', () => {
    const readings = asks.flatMap((ask) => (ask.kind === 'diagonal' ? [read(ask, ask.wasMm)] : []));
    expect(asFound(sheet, readings)).toEqual({ disagreements: [], changes: [] });
  });

  it('a closed corner makes the filler narrower at the front, an open one wider', () => {
    const ask = corner('A–B');
    expect(asFound(sheet, [read(ask, ask.wasMm - 15)]).changes).toEqual(
      expect.arrayContaining([expect.stringMatching(/^Sink wall, filler right: .* narrower/)]),
    );
    expect(asFound(sheet, [read(ask, ask.wasMm + 15)]).changes).toEqual(
      expect.arrayContaining([expect.stringMatching(/^Sink wall, filler right: .* wider/)]),
    );
  });

  it('takes from the filler what the corner takes at the depth of the run', () => {
    const ask = corner('A–B');
    const diagonal = (deg: number) =>
      Math.sqrt(
        ask.legLeftMm ** 2 +
          ask.legRightMm ** 2 -
          2 * ask.legLeftMm * ask.legRightMm * Math.cos((deg * Math.PI) / 180),
      );
    const [was] = sheet.fit.corners
      .filter(({ name }) => name === 'A–B')
      .flatMap(({ readAt }) => readAt.filter(({ zMm }) => Math.abs(zMm - ask.zMm) < 1));
    const wasDeg = was?.angle.value ?? Number.NaN;
    const sink = sheet.runs.find(({ name }) => name === 'Sink wall');
    const depthMm = (sink?.carcassDepthMm ?? 0) + (sink?.bumperMm ?? 0) + (sink?.doorMm ?? 0);
    const cot = (deg: number) => 1 / Math.tan((deg * Math.PI) / 180);
    const lostMm = depthMm * (cot(wasDeg - 2) - cot(wasDeg));
    const { changes } = asFound(sheet, [read(ask, diagonal(wasDeg - 2))]);
    const told = changes.find((words) => words.startsWith('Sink wall, filler right'));
    const [, whole = '0', top = '0', under = '1'] =
      told?.match(/: (?:(\d+) )?(?:(\d+)\/(\d+))?"/) ?? [];
    const toldMm = (Number(whole || 0) + Number(top || 0) / Number(under || 1)) * 25.4;
    expect(Math.abs(toldMm - lostMm)).toBeLessThan(1);
  });

  it('tells a floor that falls more than it did, and which kicks that raises', () => {
    const [high, low] = drops;
    const floor = sheet.fit.floor;
    if (!high || !low || !floor) throw new Error('no floor is asked');
    const fallMm = floor.highPoint.heightMm - floor.lowPoint.heightMm;
    const same = asFound(sheet, [read(high, 900), read(low, 900 + fallMm)]);
    expect(same.disagreements).toEqual([]);
    const more = asFound(sheet, [read(high, 900), read(low, 900 + fallMm + 20)]);
    expect(more.disagreements.join()).toContain('Fall of the floor');
    expect(asFound(sheet, [read(low, 900)]).disagreements).toEqual([]);
  });
});
