import { describe, expect, test } from 'vitest';
import {
  type GateInput,
  gateProblems,
  gatesFor,
  type JobFacts,
  readinessFor,
  visitKinds,
} from '@/lib/schedule';

/** A job whose cabinets are released and in build. */
const facts: JobFacts = {
  wallsReady: 'closed',
  siteReadyOn: null,
  accessGiven: true,
  notReady: '',
  measuredOn: '2026-04-20',
  release: { revision: 'B', releasedOn: '2026-05-04', isSuperseded: false },
  readyOn: null,
  floorAgreed: true,
  deliveryOn: null,
  install: null,
  basesSet: false,
};

const input = (
  kind: GateInput['kind'],
  changed: Partial<JobFacts> = {},
  today = '2026-05-06',
): GateInput => ({
  kind,
  facts: { ...facts, ...changed },
  rules: { leadWorkdays: 6, workdays: [1, 2, 3, 4, 5], closedDays: [] },
  today,
  locale: { language: 'en', region: 'US' },
});

const stateOf = (given: GateInput) => {
  const { state, from, words } = readinessFor(given);
  return { state, from, words };
};

describe('a site measure', () => {
  test('may be booked now when the walls are closed', () => {
    expect(stateOf(input('site-measure'))).toEqual({
      state: 'now',
      from: '2026-05-06',
      words: 'now: walls closed',
    });
  });
  test('may be booked on bare studs, which are said', () => {
    expect(readinessFor(input('site-measure', { wallsReady: 'bare-studs' }))).toMatchObject({
      state: 'now',
      because: 'bare studs, thickness to come is stated',
    });
  });
  test('waits for the day on which the walls will be closed', () => {
    expect(
      stateOf(input('site-measure', { wallsReady: 'not-yet', siteReadyOn: '2026-05-12' })),
    ).toEqual({
      state: 'from',
      from: '2026-05-12',
      words: 'from Tue, May 12: walls closed by then',
    });
  });
  test('is blocked while nobody knows when', () => {
    expect(stateOf(input('site-measure', { wallsReady: 'not-yet' }))).toEqual({
      state: 'blocked',
      from: null,
      words: 'not yet: walls not closed, and no date for it',
    });
  });
  test('is blocked while nobody said how to get in', () => {
    expect(readinessFor(input('site-measure', { accessGiven: false }))).toMatchObject({
      state: 'blocked',
      because: 'nobody said how to get in',
    });
  });
});

describe('a check measure', () => {
  test('comes after the site measure, and never on bare studs', () => {
    expect(readinessFor(input('check-measure')).state).toBe('now');
    expect(readinessFor(input('check-measure', { measuredOn: null })).because).toBe(
      'site measure not handed in',
    );
    expect(readinessFor(input('check-measure', { wallsReady: 'bare-studs' })).state).toBe(
      'blocked',
    );
  });
});

describe('an install', () => {
  test('may be booked from the release and the lead time in working days', () => {
    expect(stateOf(input('install'))).toEqual({
      state: 'from',
      from: '2026-05-12',
      words: 'from Tue, May 12: 6 working days after revision B',
    });
  });
  test('comes later by each closed day in between', () => {
    const given = input('install');
    const closed = { ...given, rules: { ...given.rules, closedDays: ['2026-05-08'] } };
    expect(readinessFor(closed).from).toBe('2026-05-13');
  });
  test('may be booked now once the bench says ready, whatever the lead time', () => {
    expect(stateOf(input('install', { readyOn: '2026-05-05' }))).toEqual({
      state: 'now',
      from: '2026-05-06',
      words: 'now: revision B released, cabinets ready, floor agreed, comes with the crew',
    });
  });
  test('waits for the day that the bench names', () => {
    expect(readinessFor(input('install', { readyOn: '2026-05-20' }))).toMatchObject({
      state: 'from',
      from: '2026-05-20',
      because: 'cabinets ready',
    });
  });
  test('waits for the later of the bench and the delivery', () => {
    const given = input('install', { readyOn: '2026-05-12', deliveryOn: '2026-05-14' });
    expect(readinessFor(given)).toMatchObject({ from: '2026-05-14', because: 'delivered' });
  });
  test('is blocked without a release, with an open floor, and while the customer is not ready', () => {
    const given = input('install', { release: null, floorAgreed: false, notReady: 'no power yet' });
    expect(readinessFor(given)).toMatchObject({
      state: 'blocked',
      because:
        'no revision released, cabinets not in build, floor not down and its build-up not agreed, customer says not ready: no power yet',
    });
  });
  test('is blocked by newer readings until the cabinets stand ready', () => {
    const release = { revision: 'B', releasedOn: '2026-05-04', isSuperseded: true };
    expect(readinessFor(input('install', { release })).because).toBe(
      'readings are newer than revision B: release again',
    );
    expect(readinessFor(input('install', { release, readyOn: '2026-05-05' })).state).toBe('now');
  });
  test('is blocked, and not endless, when no day is worked', () => {
    const given = input('install');
    const never = { ...given, rules: { ...given.rules, workdays: [] } };
    expect(readinessFor(never).because).toBe('no working days in the shop rules');
  });
});

describe('what follows an install', () => {
  const booked = { install: { lastDay: '2026-05-15', isDone: false } };

  test('a worktop template opens the working day after the booked install', () => {
    expect(stateOf(input('worktop-template', booked))).toEqual({
      state: 'from',
      from: '2026-05-18',
      words: 'from Mon, May 18: after the booked install',
    });
  });
  test('a worktop template may come at once when the base units are set', () => {
    expect(readinessFor(input('worktop-template', { ...booked, basesSet: true })).state).toBe(
      'now',
    );
  });
  test('a return visit needs an install', () => {
    expect(readinessFor(input('return')).because).toBe('no install is booked');
    expect(readinessFor(input('return', booked)).from).toBe('2026-05-18');
    const done = { install: { lastDay: '2026-05-05', isDone: true } };
    expect(readinessFor(input('return', done)).state).toBe('now');
  });
});

describe('booking on a day', () => {
  test('is spoken against by each gate that is not passed by then', () => {
    expect(gateProblems(input('install', { floorAgreed: false }), '2026-05-11')).toEqual([
      {
        code: 'gate-cabinets-ready',
        message: 'Not before Tue, May 12: 6 working days after revision B.',
        about: ['cabinets-ready'],
        severity: 'error',
      },
      {
        code: 'gate-floor-agreed',
        message: 'Floor not down and its build-up not agreed.',
        about: ['floor-agreed'],
        severity: 'error',
      },
    ]);
  });
  test('is free from the first day that all gates allow', () => {
    expect(gateProblems(input('install'), '2026-05-12')).toEqual([]);
  });
});

test('every kind of visit has gates, and none names one twice', () => {
  for (const kind of visitKinds) {
    const keys = gatesFor(input(kind)).map((gate) => gate.key);
    expect(keys.length).toBeGreaterThan(0);
    expect(new Set(keys).size).toBe(keys.length);
  }
});

test('booking on the day of readiness is never spoken against, for any kind and state of job', () => {
  const changes: Partial<JobFacts>[] = [
    {},
    { readyOn: '2026-05-20' },
    { wallsReady: 'not-yet', siteReadyOn: '2026-06-01' },
    { install: { lastDay: '2026-05-15', isDone: false } },
    { deliveryOn: '2026-05-22' },
    { release: null },
  ];
  for (const kind of visitKinds) {
    for (const changed of changes) {
      const given = input(kind, changed);
      const { from } = readinessFor(given);
      if (from !== null) expect(gateProblems(given, from)).toEqual([]);
      else expect(gateProblems(given, '2099-12-31').length).toBeGreaterThan(0);
    }
  }
});
