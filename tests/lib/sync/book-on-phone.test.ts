import { describe, expect, it } from 'vitest';
import { bookOnPhone, newerView, withSent } from '@/lib/sync/book-on-phone';
import { stripState } from '@/lib/sync/strip-words';
import {
  exampleLength,
  exampleRoom,
  exampleView,
  id,
  queuedExample,
} from '@/tests/help/wall-book-examples';

const [one, two, three] = [1, 2, 3].map((number) => exampleLength(number)) as [
  ReturnType<typeof exampleLength>,
  ReturnType<typeof exampleLength>,
  ReturnType<typeof exampleLength>,
];
const idsIn = (view: ReturnType<typeof exampleView>) =>
  view.wallBook.readings.map((reading) => reading.id);

describe('bookOnPhone', () => {
  it('adds what is still here to what the office showed, each once', () => {
    const queue = [
      queuedExample(2, { kind: 'reading', reading: three }),
      queuedExample(1, { kind: 'reading', reading: two }),
    ];
    expect(idsIn(bookOnPhone(exampleView([one, two]), queue))).toEqual([one.id, two.id, three.id]);
  });

  it('shows a parked reading too: it was read', () => {
    const queue = [queuedExample(1, { kind: 'reading', reading: one }, { parked: 'No such room' })];
    expect(idsIn(bookOnPhone(exampleView(), queue))).toEqual([one.id]);
  });

  it('leaves readings of another room out', () => {
    const elsewhere = exampleLength(4, { roomId: id(90) });
    const queue = [queuedExample(1, { kind: 'reading', reading: elsewhere })];
    expect(idsIn(bookOnPhone(exampleView(), queue))).toEqual([]);
  });

  it('draws the newest room that waits, not one that the office refused', () => {
    const drawn = (name: string) =>
      ({ kind: 'room', jobId: id(2), room: { ...exampleRoom, name } }) as const;
    const queue = [
      queuedExample(1, drawn('first')),
      queuedExample(2, drawn('second')),
      queuedExample(3, drawn('refused'), { parked: 'Wall B has readings.' }),
    ];
    expect(bookOnPhone(exampleView(), queue).wallBook.room.name).toBe('second');
  });

  it('draws a refused room where the office has none', () => {
    const view = exampleView();
    const empty = withSent(view, [], { ...exampleRoom, chains: [] });
    const queue = [
      queuedExample(
        1,
        { kind: 'room', jobId: id(2), room: exampleRoom },
        { parked: 'Not your role.' },
      ),
    ];
    expect(bookOnPhone(empty, queue).wallBook.room.chains).toHaveLength(1);
  });
});

describe('newerView', () => {
  it('keeps a reading that the office took after the newer page was drawn', () => {
    const kept = exampleView([one, two]);
    expect(idsIn(newerView(kept, exampleView([one])))).toEqual([one.id, two.id]);
  });

  it('takes the office’s view where the phone has none', () => {
    expect(idsIn(newerView(null, exampleView([one])))).toEqual([one.id]);
  });
});

describe('stripState', () => {
  const item = queuedExample(1, { kind: 'reading', reading: one });
  const base = {
    unsent: [],
    personId: 'ann',
    isSignedOut: false,
    isOffline: false,
    isReady: false,
  };

  it.each([
    [{}, 'sent', 'all sent'],
    [{ isReady: true }, 'sent', 'all sent · ready for no signal'],
    [{ unsent: [item] }, 'waiting', 'saved here · 1 to send'],
    [{ unsent: [item], isOffline: true }, 'waiting', 'saved here · 1, no signal'],
    [{ unsent: [item], isSignedOut: true }, 'sign-in', 'saved here · sign in to send 1'],
    [{ unsent: [{ ...item, parked: 'no' }] }, 'parked', 'saved here · 1 not taken'],
    [{ unsent: [{ ...item, personId: 'ben' }] }, 'sent', 'all sent · 1 of another person'],
  ] as const)('says of %j: %s, "%s"', (change, kind, words) => {
    expect(stripState({ ...base, ...change })).toEqual({ kind, words });
  });
});
