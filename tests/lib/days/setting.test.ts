import { describe, expect, it } from 'vitest';
import { siteCautions } from '@/lib/cautions/site-cautions';
import type { Run } from '@/lib/contracts/runs';
import { checklistOf, usualChecklists } from '@/lib/days/checklists';
import { settingLines } from '@/lib/days/setting-lines';
import { settingOrder } from '@/lib/days/setting-order';
import { whatToBring } from '@/lib/days/what-to-bring';
import { visitKinds } from '@/lib/schedule/visit-kind';
import { crewWords, inRegion } from '@/lib/words/crew';
import { releasedSheet } from '../../help/released-sheet';

const sheet = releasedSheet();
const { runs, fit, rules } = sheet;

describe('what a crew brings', () => {
  const items = whatToBring([sheet]);
  const fillers = items.flatMap((item) => (item.what === 'filler' ? [item] : []));

  it('counts every filler of the fit once, by length, and at least as wide as its widest blank', () => {
    const blanks = fit.runs.flatMap((run) =>
      [run.left.filler, run.right.filler].flatMap((filler) => (filler ? [filler] : [])),
    );
    expect(fillers.reduce((sum, { count }) => sum + count, 0)).toBe(blanks.length);
    const widest = Math.max(...fillers.map(({ widestMm }) => widestMm));
    expect(widest).toBeGreaterThanOrEqual(
      Math.max(...blanks.map(({ blank }) => blank.value)) - 1e-3,
    );
    const lengths = fillers.map(({ lengthMm }) => lengthMm);
    expect(lengths).toEqual([...new Set(lengths)].sort((one, other) => other - one));
  });

  it('brings four legs a box that stands, and none where nothing is set', () => {
    const legs = items.find((item) => item.what === 'legs');
    if (legs?.what !== 'legs') throw new Error('no legs');
    expect(legs.count % 4).toBe(0);
    expect(legs.mostMm).toBeGreaterThanOrEqual(legs.leastMm);
    expect(whatToBring([]).map(({ what }) => what)).toEqual([
      'fixings',
      'finder',
      'level',
      'protection',
    ]);
  });
});

describe('the order of setting', () => {
  it('strikes lines first, hangs nothing before what is tall stands, and walks through last', () => {
    const steps = settingOrder(runs).map(({ step }) => step);
    expect(steps[0]).toBe('lines');
    expect(steps.at(-1)).toBe('walk');
    expect(steps.indexOf('tall')).toBeLessThan(steps.indexOf('wall'));
    expect(steps.lastIndexOf('wall')).toBeLessThan(steps.indexOf('base'));
  });

  it('begins a run at its corner, at its mark, or at the end that is fixed', () => {
    const [base] = runs.filter(({ level }) => level === 'base');
    if (!base) throw new Error('no base run');
    const startOf = (run: Run) => settingOrder([run])[1];
    const [first, second] = base.units;
    if (!first || !second) throw new Error('too few boxes');
    const corner = { ...second, kind: 'corner' as const, name: 'Blind' };
    const plain = { ...first, kind: 'base' as const, name: 'First' };
    expect(startOf({ ...base, units: [plain, corner] })).toMatchObject({
      startAt: 'Blind',
      why: 'corner',
    });
    const share = { how: 'centred' as const, unitId: plain.id, markMm: 900 };
    expect(startOf({ ...base, units: [plain, corner], share })).toMatchObject({
      startAt: 'First',
      why: 'centred',
    });
    const free = { ...base, left: { kind: 'open' as const, limitMm: 100 } };
    const last = { ...plain, id: second.id, name: 'Last' };
    const share2 = { how: 'equal' as const };
    expect(startOf({ ...free, units: [plain, last], share: share2 })).toMatchObject({
      startAt: 'Last',
      why: 'end',
    });
  });
});

describe('what stands on the crew’s sheet', () => {
  it.each(['en', 'es'] as const)(
    'says levels, fillers with tapers, kicks and studs in %s',
    (language) => {
      const lines = settingLines(sheet, crewWords[language]);
      const of = (section: string) => lines.filter((line) => line.section === section);
      expect(of('levels')[0]?.said).toContain('▼');
      const fillers = fit.runs
        .flatMap((run) => [run.left.filler, run.right.filler])
        .filter(Boolean);
      expect(of('fillers')).toHaveLength(fillers.length);
      expect(of('kicks').length).toBe(fit.runs.filter(({ kicks }) => kicks).length);
      expect(lines.every(({ said }) => !/NaN|undefined|null/.test(said))).toBe(true);
    },
  );

  it('warns of what is here, with the source of each figure, and defers to local codes last', () => {
    const here = siteCautions({ runs, fit, features: ['gas'], isOldHouse: true, region: 'US' });
    const kinds = here.map(({ kind }) => kind);
    expect(kinds).toEqual(expect.arrayContaining(['lift', 'hang-alone', 'tall', 'wall-fixing']));
    expect(kinds.at(-1)).toBe('codes');
    for (const caution of here) {
      if (caution.kg !== undefined || caution.year !== undefined) {
        expect(caution.source).not.toBe('');
      }
    }
    const bare = siteCautions({ runs: [], fit, features: [], isOldHouse: false, region: 'UK' });
    expect(bare.map(({ kind }) => kind)).not.toEqual(expect.arrayContaining(['tall']));
    const alone = here.find(({ kind }) => kind === 'hang-alone');
    if (!alone) throw new Error('nothing hangs');
    for (const words of Object.values(crewWords)) {
      expect(words.cautionWords['hang-alone'](alone)).toContain(String(alone.kg));
    }
  });

  it('calls things as the shop’s region calls them', () => {
    expect(inRegion('{Kick} face, no {drywall} screws', { region: 'US', language: 'en' })).toBe(
      'Toe kick face, no drywall screws',
    );
    expect(inRegion('{Kick} face, {kick}', { region: 'UK', language: 'en' })).toBe(
      'Plinth face, plinth',
    );
    expect(inRegion('Alturas del {kick}', { region: 'US', language: 'es' })).toBe(
      'Alturas del zoclo',
    );
    expect(rules.region).toBe('US');
  });
});

describe('checklists', () => {
  it('has a list for every kind of visit, with keys of its own and words in both languages', () => {
    for (const kind of visitKinds) {
      const list = checklistOf(kind, undefined);
      expect(list.length).toBeGreaterThan(2);
      expect(new Set(list.map(({ key }) => key)).size).toBe(list.length);
      expect(list.every(({ words }) => words.en !== '' && words.es !== '')).toBe(true);
    }
  });

  it('is the shop’s own where it has one, also when that is empty', () => {
    expect(checklistOf('install', { install: [] })).toEqual([]);
    expect(checklistOf('return', { install: [] })).toBe(usualChecklists.return);
  });
});
