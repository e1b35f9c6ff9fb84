import { describe, expect, it } from 'vitest';
import { backOffMs } from '@/lib/sync/back-off';
import { type Batch, nextBatch } from '@/lib/sync/next-batch';
import { settleBatch } from '@/lib/sync/settle-batch';
import { exampleLength, exampleRoom, id, queuedExample } from '@/tests/help/wall-book-examples';

const [a, b] = [id(1_001), id(1_002)];
const readings = batchOf([
  queuedExample(1, { kind: 'reading', reading: exampleLength(1) }),
  queuedExample(2, { kind: 'reading', reading: exampleLength(2) }),
]);
const room = batchOf([queuedExample(1, { kind: 'room', jobId: id(2), room: exampleRoom })]);

describe('settleBatch', () => {
  it('lets only the ids leave that the office named', () => {
    expect(settleBatch(readings, { status: 200, json: { accepted: [a], parked: [] } })).toEqual({
      sentIds: [a],
      parked: [],
      next: 'go-on',
    });
  });

  it('ignores ids that were not sent', () => {
    const json = { accepted: [a, id(77)], parked: [{ id: id(78), message: 'no' }] };
    expect(settleBatch(readings, { status: 200, json })).toMatchObject({
      sentIds: [a],
      parked: [],
    });
  });

  it('parks what the office did not understand, with its words', () => {
    const json = { accepted: [a], parked: [{ id: b, message: 'zMm: too high' }] };
    expect(settleBatch(readings, { status: 200, json })).toMatchObject({
      sentIds: [a],
      parked: [{ id: b, message: 'zMm: too high' }],
    });
  });

  it.each([null, 'Welcome to the hotel', { accepted: 'all' }, { accepted: [] }, []])(
    'keeps everything on a 200 that says %j',
    (json) => {
      expect(settleBatch(readings, { status: 200, json })).toEqual({
        sentIds: [],
        parked: [],
        next: 'wait',
      });
    },
  );

  it('lets a room leave on the office’s own JSON only', () => {
    expect(
      settleBatch(room, { status: 200, json: { roomId: exampleRoom.id } }).sentIds,
    ).toHaveLength(1);
    expect(settleBatch(room, { status: 200, json: null })).toMatchObject({
      sentIds: [],
      next: 'wait',
    });
  });

  it('keeps everything and asks for sign-in on 401', () => {
    expect(settleBatch(readings, { status: 401, json: null })).toEqual({
      sentIds: [],
      parked: [],
      next: 'sign-in',
    });
  });

  it.each([400, 403, 404, 409, 422])('parks and shows on %i', (status) => {
    const json = { title: 'No such room', status, detail: 'There is no such room in this shop.' };
    expect(settleBatch(readings, { status, json })).toEqual({
      sentIds: [],
      parked: [a, b].map((each) => ({ id: each, message: 'There is no such room in this shop.' })),
      next: 'go-on',
    });
  });

  it.each([302, 408, 425, 429, 500, 502, 503])('keeps and tries again on %i', (status) => {
    expect(settleBatch(readings, { status, json: null })).toMatchObject({
      sentIds: [],
      parked: [],
      next: 'wait',
    });
  });

  it('keeps and tries again when nothing came back', () => {
    expect(settleBatch(readings, 'no-answer')).toMatchObject({ sentIds: [], next: 'wait' });
  });
});

describe('backOffMs', () => {
  it('doubles from a second to a minute', () => {
    expect([0, 1, 2, 3, 7, 8, 500].map((failures) => backOffMs(failures, 0.5))).toEqual([
      0, 1_000, 2_000, 4_000, 60_000, 60_000, 60_000,
    ]);
  });

  it('spreads by a quarter either way', () => {
    expect([backOffMs(3, 0), backOffMs(3, 1)]).toEqual([3_000, 5_000]);
  });
});

function batchOf(queue: Parameters<typeof nextBatch>[0]): Batch {
  const batch = nextBatch(queue, 'ann');
  if (!batch) throw new Error('nothing to send');
  return batch;
}
