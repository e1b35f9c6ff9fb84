import { describe, expect, it } from 'vitest';
import type { Reading } from '@/lib/contracts/readings';
import type { Run } from '@/lib/contracts/runs';
import type { WallBook } from '@/lib/contracts/wall-book';
import { standingIds } from '@/lib/measure/standing-readings';
import { supersededBy } from '@/lib/sheet/sheet-changes';
import { sheetKey } from '@/lib/sheet/sheet-key';
import { countedIds, crookedKitchen } from '../../help/crooked-kitchen';

type State = { wallBook: WallBook; runs: Run[] };
const kitchen: State = crookedKitchen();
const newId = countedIds(90_000);
const lengths = kitchen.wallBook.readings.filter((one) => one.kind === 'length');
const [first, second] = lengths;
const [sinkWall, uppers] = kitchen.runs;
if (!first || !second || !sinkWall || !uppers) throw new Error('the kitchen is not whole');

const withReadings = (...more: Reading[]): State => ({
  ...kitchen,
  wallBook: { ...kitchen.wallBook, readings: [...kitchen.wallBook.readings, ...more] },
});
const withRuns = (...runs: Run[]): State => ({ ...kitchen, runs });
const withSinkWall = (change: Partial<Run>): State =>
  withRuns({ ...sinkWall, ...change }, ...kitchen.runs.slice(1));
const withRoom = (change: Partial<WallBook['room']>): State => ({
  ...kitchen,
  wallBook: { ...kitchen.wallBook, room: { ...kitchen.wallBook.room, ...change } },
});
const takeBack = (reading: Reading): Reading => ({
  ...common(reading),
  kind: 'withdrawal',
  readingId: reading.id,
  reason: 'wrong wall',
});
const common = ({ roomId, toolId, takenAt, unit, touches }: Reading) => ({
  id: newId(),
  roomId,
  toolId,
  takenAt,
  unit,
  touches,
  typed: '',
});

const correction: Reading = { ...first, id: newId(), replaces: first.id, valueMm: 3621.0875 };
const changes: [string, State, string[]][] = [
  [
    'a corrected reading, with both values',
    withReadings(correction),
    ['Wall A, length at 4": 141 3/4" is now 142 9/16"'],
  ],
  [
    'a correction of a correction, against what was released',
    withReadings(correction, {
      ...first,
      id: newId(),
      replaces: correction.id,
      valueMm: 3602.0375,
    }),
    ['Wall A, length at 4": 141 3/4" is now 141 13/16"'],
  ],
  [
    'a repeat',
    withReadings({ ...first, id: newId() }),
    ['Read since: Wall A, length at 4", 141 3/4"'],
  ],
  ['a reading taken back', withReadings(takeBack(first)), ['Taken back: Wall A, length at 4"']],
  [
    'many readings at once by their number',
    withReadings(...Array.from({ length: 7 }, () => ({ ...first, id: newId() }))),
    ['7 readings more'],
  ],
  [
    'a unit made narrower',
    withSinkWall({
      units: sinkWall.units.map((unit) =>
        unit.kind === 'sink' ? { ...unit, widthMm: 838.2 } : unit,
      ),
    }),
    ['Sink wall: sink 36" is now 33"'],
  ],
  [
    'a unit gone',
    withSinkWall({ units: sinkWall.units.slice(1) }),
    ['Sink wall: drawers 21" is gone'],
  ],
  [
    'units in another order',
    withSinkWall({ units: [...sinkWall.units].reverse() }),
    ['Sink wall: the units stand in another order'],
  ],
  ['a depth', withSinkWall({ carcassDepthMm: 609.6 }), ['Sink wall: depth 23" is now 24"']],
  [
    'an end',
    withSinkWall({ right: { kind: 'open', limitMm: 3556 } }),
    ['Sink wall: the right end now meets nothing, open to 140"'],
  ],
  ['a run gone', withRuns(...kitchen.runs.slice(1)), ['Sink wall: the run is gone']],
  [
    'a run more',
    withRuns(...kitchen.runs, { ...uppers, id: newId(), name: 'Bar' }),
    ['Bar: a new run on wall A'],
  ],
  ['a floor to come', withRoom({ floorToComeMm: 19.05 }), ['Floor still to come: 0" is now 3/4"']],
  [
    'cabinets on another floor',
    withRoom({ cabinetsStandOn: 'rough-floor' }),
    ['The cabinets now stand on the rough floor'],
  ],
  ['walls drawn anew', withRoom({ chains: [] }), ['The walls were drawn anew']],
];

const unmoved: [string, State][] = [
  ['nothing', kitchen],
  [
    'a reading read and taken back',
    (() => {
      const reading = { ...first, id: newId() };
      return withReadings(reading, takeBack(reading));
    })(),
  ],
  [
    'a reading skipped',
    withReadings({ ...common(first), kind: 'skip', slot: 'x', reason: 'crate in the way' }),
  ],
  ['another name of the room', withRoom({ name: 'Big kitchen' })],
  ['runs in another order', withRuns(...[...kitchen.runs].reverse())],
  [
    'a unit that may be altered',
    withSinkWall({ units: sinkWall.units.map((unit) => ({ ...unit, alterable: null })) }),
  ],
];

describe('supersededBy', () => {
  it.each(changes)('tells %s', (_name, now, words) => {
    expect(supersededBy(kitchen, now, 'in')).toEqual(words);
  });

  it.each(unmoved)('tells nothing of %s', (_name, now) => {
    expect(supersededBy(kitchen, now, 'in')).toEqual([]);
  });

  it('agrees with the key by which lists mark a sheet as superseded', () => {
    const key = ({ wallBook, runs }: State) =>
      sheetKey({ room: wallBook.room, runs, standingIds: standingIds(wallBook.readings) });
    for (const [, now] of changes) expect(key(now)).not.toBe(key(kitchen));
    for (const [, now] of unmoved) expect(key(now)).toBe(key(kitchen));
  });
});
