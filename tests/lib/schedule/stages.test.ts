import fc from 'fast-check';
import { expect, test } from 'vitest';
import { type StageEvent, stageAfter, stageByHistory, stages, stageWords } from '@/lib/schedule';

const chain: StageEvent[] = [
  'measure-booked',
  'readings-handed-in',
  'revision-released',
  'sheet-taken-up',
  'bench-says-ready',
  'arrived-for-install',
  'snag-opened',
  'signed',
];

test('a job goes through the chain, each step because something happened', () => {
  const passed = chain.map((_, index) => stageByHistory(chain.slice(0, index + 1)));
  expect(passed).toEqual([
    'to-measure',
    'measured',
    'released',
    'in-build',
    'ready',
    'installing',
    'snags',
    'signed-off',
  ]);
});

test('a job without snags goes from installing to signed off', () => {
  expect(stageAfter('installing', 'signed')).toBe('signed-off');
});

test('an event that is told twice, or late from a phone, moves nothing back', () => {
  expect(stageAfter('released', 'readings-handed-in')).toBe('released');
  expect(stageAfter('installing', 'bench-says-ready')).toBe('installing');
  expect(stageAfter('ready', 'measure-booked')).toBe('ready');
  const twice = chain.flatMap((event) => [event, event]);
  expect(stageByHistory(twice)).toBe('signed-off');
});

test('a new revision sends cabinets in build, or ready, back to the bench', () => {
  expect(stageAfter('in-build', 'revision-released')).toBe('released');
  expect(stageAfter('ready', 'revision-released')).toBe('released');
  expect(stageAfter('installing', 'revision-released')).toBe('installing');
});

test('a snag after the signature stands apart', () => {
  expect(stageAfter('signed-off', 'snag-opened')).toBe('signed-off');
});

test('a job on hold stays so, and is taken up where its history left it', () => {
  expect(stageAfter('measured', 'put-on-hold')).toBe('on-hold');
  expect(stageAfter('on-hold', 'revision-released')).toBe('on-hold');
  expect(stageAfter('on-hold', 'called-off')).toBe('called-off');
  const history: StageEvent[] = [
    'measure-booked',
    'readings-handed-in',
    'put-on-hold',
    'revision-released',
  ];
  expect(stageByHistory(history)).toBe('released');
});

test('a job called off is not woken by any event', () => {
  for (const event of [...chain, 'put-on-hold', 'called-off'] as StageEvent[]) {
    expect(stageAfter('called-off', event)).toBe('called-off');
  }
});

test('any history ends in a stage that has a name', () => {
  const event = fc.constantFrom<StageEvent>(...chain, 'put-on-hold', 'called-off');
  fc.assert(
    fc.property(fc.array(event, { maxLength: 30 }), (history) => {
      const stage = stageByHistory(history);
      expect(stages).toContain(stage);
      expect(stageWords[stage]).toMatch(/^[A-Z]/);
    }),
  );
});
