import { describe, expect, it } from 'vitest';
import type { DayEvent } from '@/lib/contracts/day-events';
import type { StopView } from '@/lib/contracts/stops';
import { newerStop, stopOnPhone } from '@/lib/days/stop-on-phone';
import { nextBatch } from '@/lib/sync/next-batch';
import { settleBatch } from '@/lib/sync/settle-batch';
import { id, queuedExample } from '@/tests/help/wall-book-examples';

const visitId = id(700);
const tapper = { personName: 'Bo', momentWords: (at: string) => at.slice(11, 16) };
const at = (time: string) => `2026-12-01T${time}:00.000Z`;
const empty: StopView = {
  visitId,
  jobId: id(701),
  date: '2026-12-01',
  parking: '',
  hasAccessCode: false,
  mayTakeCode: false,
  finish: '',
  sheets: [],
  checklist: [],
  checks: [],
  pauses: [],
  snags: [],
  asFound: [],
  signOff: null,
};
const snag: DayEvent = {
  what: 'snag',
  id: id(710),
  visitId,
  at: at('10:00'),
  kind: 'fault',
  roomId: null,
  unitId: null,
  place: 'Sink',
  words: 'rubs',
  mender: 'crew',
  dueOn: null,
  photoIds: [],
};
const closing: DayEvent = {
  what: 'close-snag',
  id: id(711),
  visitId,
  at: at('11:00'),
  snagId: snag.id,
  words: 'planed',
  photoIds: [],
};
const check = (answer: 'yes' | 'no', time: string): DayEvent => ({
  what: 'check',
  id: id(answer === 'yes' ? 712 : 713),
  visitId,
  at: at(time),
  item: 'cables',
  answer,
  words: '',
});

describe('a stop on the phone', () => {
  it('shows what was tapped here over what the office said, each once', () => {
    const events = [snag, closing, check('no', '09:00'), check('yes', '09:30')];
    const here = stopOnPhone(empty, events, tapper);
    expect(here.snags).toMatchObject([{ id: snag.id, closedBy: 'Bo', closedWords: 'planed' }]);
    expect(here.checks).toMatchObject([{ item: 'cables', answer: 'yes' }]);
    expect(stopOnPhone(here, events, tapper)).toEqual(here);
    expect(stopOnPhone(empty, [{ ...snag, visitId: id(1) }], tapper)).toEqual(empty);
  });

  it('loses no tap when the office’s answer is older than the tap', () => {
    const here = stopOnPhone(empty, [snag, closing, check('yes', '09:00')], tapper);
    expect(newerStop(here, empty)).toEqual(here);
    const openAtOffice = { ...empty, snags: here.snags.map((one) => ({ ...one, closedAt: null })) };
    expect(newerStop(here, openAtOffice).snags[0]?.closedAt).toBe(closing.at);
    expect(newerStop(null, empty)).toBe(empty);
  });
});

describe('a crew’s taps in the queue', () => {
  const event = (order: number, one: DayEvent) =>
    queuedExample(order, { kind: 'event', event: one });
  const report = {
    kind: 'report' as const,
    report: { visitId, what: 'arrived' as const, at: at('08:00') },
  };

  it('go together in their order, and never past a tap that was made between them', () => {
    const queue = [
      event(1, snag),
      event(2, closing),
      queuedExample(3, report),
      event(4, check('yes', '12:00')),
    ];
    expect(nextBatch(queue, 'ann')).toMatchObject({
      path: '/api/days/events',
      body: { events: [{ id: snag.id }, { id: closing.id }] },
    });
    expect(nextBatch(queue.slice(2), 'ann')?.path).toContain('/report');
  });

  it('leave the phone only when the office has named them', () => {
    const queue = [event(1, snag), event(2, closing)];
    const batch = nextBatch(queue, 'ann');
    if (!batch) throw new Error('nothing is sent');
    const ids = batch.items.map((item) => item.id);
    const [first = '', second = ''] = ids;
    expect(settleBatch(batch, { status: 200, json: { fine: true } }).next).toBe('wait');
    const answer = {
      accepted: [first],
      parked: [{ id: second, message: 'There is no such snag.' }],
    };
    expect(settleBatch(batch, { status: 200, json: answer })).toEqual({
      sentIds: [first],
      parked: [{ id: second, message: 'There is no such snag.' }],
      next: 'go-on',
    });
  });
});
