import { describe, expect, it } from 'vitest';
import { fitRoom } from '@/lib/measure/fit-room';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { cutList } from '@/lib/sheet/cut-list';
import { crookedKitchen } from '../../help/crooked-kitchen';

const rules = defaultShopRules('US').fit;
const { wallBook, runs } = crookedKitchen();
const fit = fitRoom(wallBook, runs, rules);
const rows = cutList(fit, runs, 'US');

describe('cutList', () => {
  it('calls a kick as the shop’s region does', () => {
    const pieces = (region: 'UK' | 'AU') => cutList(fit, runs, region).map(({ piece }) => piece);
    expect(pieces('UK')).toContain('Plinth face');
    expect(pieces('AU')).toContain('Kickboard face');
    expect(pieces('UK').join()).not.toContain('kick');
  });

  it('lists fillers, kick faces and finished ends run by run, each once', () => {
    expect(rows.map(({ runName, piece }) => `${runName}: ${piece}`)).toEqual([
      'Sink wall: Filler, left',
      'Sink wall: Filler, right',
      'Sink wall: Toe kick face',
      'Uppers left: Filler, left',
      'Uppers left: Filler, right',
      'Uppers left: Filler to the ceiling',
      'Uppers right: Filler, left',
      'Uppers right: Filler, right',
      'Uppers right: Filler to the ceiling',
      'Tall wall: Filler, right',
      'Tall wall: Finished end, end panel',
      'Tall wall: Toe kick face',
      'Tall wall: Toe kick return, left',
      'Tall wall: Filler to the ceiling',
    ]);
    expect(new Set(rows.map(({ key }) => key)).size).toBe(rows.length);
  });

  it('never cuts a blank narrower than the widest face that it must cover', () => {
    for (const { piece, first, last, cut } of rows.filter(({ how }) => how === 'blank')) {
      const widest = Math.max(first?.value ?? 0, last?.value ?? 0);
      expect(cut.value, piece).toBeGreaterThan(widest);
    }
  });

  it('lists the mitre of a corner only where runs meet at it', () => {
    expect(rows.some(({ how }) => how === 'saw')).toBe(false);
    const [sink, , , tall] = runs;
    if (!sink || !tall) throw new Error('the kitchen is not whole');
    const [, wallB] = wallBook.room.chains[0]?.walls ?? [];
    const side = {
      ...tall,
      wallId: wallB?.id ?? '',
      left: { kind: 'run', runId: sink.id, through: 'other' } as const,
    };
    const meeting = [
      { ...sink, right: { kind: 'run', runId: side.id, through: 'this' } as const },
      side,
    ];
    const saws = cutList(fitRoom(wallBook, meeting, rules), meeting, 'US').filter(
      ({ how }) => how === 'saw',
    );
    expect(saws.map(({ runName }) => runName)).toEqual(['Corner A–B']);
    expect(saws[0]?.cut.value).toBeCloseTo(Math.abs(90 - 91.18 / 2), 1);
  });

  it('says at which end of its run a piece goes', () => {
    const ends = rows.filter(({ end }) => end !== null).map(({ piece, end }) => [piece, end]);
    expect(ends).toContainEqual(['Filler, left', 'left']);
    expect(ends).toContainEqual(['Finished end, end panel', 'left']);
    expect(ends).toContainEqual(['Toe kick return, left', 'left']);
    expect(ends).not.toContainEqual(['Toe kick face', 'left']);
  });

  it('turns the crown of a run round its finished end, and closes nothing where the run is left open', () => {
    const over = (overBoxes: 'crown' | 'open') => {
      const crowned = runs.map((run) => (run.level === 'tall' ? { ...run, overBoxes } : run));
      const ofTall = (row: (typeof rows)[number]) => row.runName === 'Tall wall';
      return cutList(fitRoom(wallBook, crowned, rules), crowned, 'US').filter(ofTall);
    };
    const crown = over('crown').find(({ piece }) => piece === 'Crown, left');
    expect(crown).toMatchObject({ how: 'saw', end: 'left' });
    expect(crown?.cut.value).toBeCloseTo(31.62, 2);
    expect(crown?.note).toBe('flat on the saw, blade tilted 33.9°; outside corner');
    expect(over('crown').map(({ piece }) => piece)).toContain('Backing of the crown');
    expect(over('open').some(({ piece }) => /ceiling|rown/.test(piece))).toBe(false);
  });

  it('never states a blank as exact, for the box beside it is not', () => {
    for (const { cut, how, piece } of rows) {
      if (how === 'blank') expect(cut.U, piece).toBeGreaterThan(0.1);
    }
  });

  it('marks the filler of a run that is too long', () => {
    const wide = runs.map((run) => ({
      ...run,
      units: run.units.map((unit) => ({ ...unit, widthMm: unit.widthMm + 20 })),
    }));
    const wrong = cutList(fitRoom(wallBook, wide, rules), wide, 'US').filter(
      ({ isWrong }) => isWrong,
    );
    expect(wrong.map(({ runName }) => runName)).toContain('Sink wall');
  });
});
