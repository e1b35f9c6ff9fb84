import { describe, expect, it } from 'vitest';
import { MOST_READINGS, nextBatch } from '@/lib/sync/next-batch';
import type { QueuedWork } from '@/lib/sync/queued';
import { exampleLength, exampleRoom, id, queuedExample } from '@/tests/help/wall-book-examples';

const reading = (number: number, roomId = exampleRoom.id): QueuedWork => ({
  kind: 'reading',
  reading: exampleLength(number, { roomId }),
});
const room: QueuedWork = { kind: 'room', jobId: id(2), room: exampleRoom };
const submit: QueuedWork = { kind: 'submit', roomId: exampleRoom.id };
const idsOf = (batch: ReturnType<typeof nextBatch>) => batch?.items.map((item) => item.order);

describe('nextBatch', () => {
  it('has nothing to send when the queue is empty', () => {
    expect(nextBatch([], 'ann')).toBeNull();
  });

  it('sends a room before the readings taken in it', () => {
    const queue = [queuedExample(1, room), queuedExample(2, reading(1))];
    expect(nextBatch(queue, 'ann')).toMatchObject({
      path: '/api/rooms',
      body: { jobId: id(2), room: { id: exampleRoom.id } },
    });
  });

  it('sends readings of one room together, in the order kept, whatever order the store gives them in', () => {
    const queue = [3, 1, 2].map((order) => queuedExample(order, reading(order)));
    const batch = nextBatch(queue, 'ann');
    expect(idsOf(batch)).toEqual([1, 2, 3]);
    expect(batch).toMatchObject({
      path: '/api/readings',
      body: {
        roomId: exampleRoom.id,
        readings: [{ id: id(1_001) }, { id: id(1_002) }, { id: id(1_003) }],
      },
    });
  });

  it('ends a batch where another room begins', () => {
    const queue = [
      queuedExample(1, reading(1)),
      queuedExample(2, reading(2, id(99))),
      queuedExample(3, reading(3)),
    ];
    expect(idsOf(nextBatch(queue, 'ann'))).toEqual([1]);
  });

  it('sends no more at once than a weak signal carries', () => {
    const queue = Array.from({ length: 120 }, (_, at) => queuedExample(at + 1, reading(at)));
    expect(nextBatch(queue, 'ann')?.items).toHaveLength(MOST_READINGS);
  });

  it('passes over a parked reading', () => {
    const queue = [
      queuedExample(1, reading(1), { parked: 'Not understood.' }),
      queuedExample(2, reading(2)),
    ];
    expect(idsOf(nextBatch(queue, 'ann'))).toEqual([2]);
  });

  it('does not hand a room in while a reading of it is parked', () => {
    const queue = [
      queuedExample(1, reading(1), { parked: 'Not understood.' }),
      queuedExample(2, submit),
    ];
    expect(nextBatch(queue, 'ann')).toBeNull();
  });

  it('leaves what another person took for that person', () => {
    const queue = [queuedExample(1, reading(1), { personId: 'ben' }), queuedExample(2, submit)];
    expect(nextBatch(queue, 'ann')).toMatchObject({ path: `/api/rooms/${exampleRoom.id}/submit` });
    expect(idsOf(nextBatch(queue, 'ben'))).toEqual([1]);
  });

  it('sends a tap on a visit to that visit', () => {
    const report = { visitId: id(7), what: 'arrived', at: '2026-12-01T09:00:00.000Z' } as const;
    const queue = [queuedExample(1, { kind: 'report', report })];
    expect(nextBatch(queue, 'ann')).toMatchObject({
      path: `/api/visits/${id(7)}/report`,
      body: report,
    });
  });
});
