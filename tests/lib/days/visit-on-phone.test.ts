import { describe, expect, it } from 'vitest';
import type { VisitStatus } from '@/lib/contracts/visits';
import { furtherVisit, isOver, visitAfter, waitingWork } from '@/lib/days/visit-on-phone';
import type { QueuedWork } from '@/lib/sync/queued';
import { id, queuedExample } from '@/tests/help/wall-book-examples';

type What = 'on-the-way' | 'running-late' | 'arrived' | 'done' | 'nobody-home';
const visit = (status: VisitStatus = 'confirmed', more: object = {}) => ({
  id: id(7),
  status,
  arrivedAt: null,
  leftAt: null,
  ...more,
});
const tap = (what: What, hour = 9, visitId = id(7)): QueuedWork => ({
  kind: 'report',
  report: { visitId, what, at: at(hour) },
});
const at = (hour: number) => `2026-12-01T${String(hour).padStart(2, '0')}:00:00.000Z`;

describe('a visit on the phone', () => {
  it('stands as it was tapped, with when they came and left, before the office has heard', () => {
    const taps = [tap('on-the-way', 7), tap('arrived', 8), tap('done', 12)];
    expect(visitAfter(visit(), taps)).toMatchObject({
      status: 'done',
      arrivedAt: at(8),
      leftAt: at(12),
    });
  });

  it('stands as the office has it when nothing was tapped, or another visit was', () => {
    expect(visitAfter(visit(), [tap('arrived', 9, id(8))])).toEqual(visit());
  });

  it('goes back by no tap that was late, and by none of running late', () => {
    const there = visit('on-site', { arrivedAt: at(8) });
    expect(visitAfter(there, [tap('on-the-way'), tap('running-late'), tap('arrived')])).toEqual(
      there,
    );
  });

  it('does not count a tap that the office refused', () => {
    const refused = { ...queuedExample(1, tap('arrived')), parked: 'called off' };
    expect(visitAfter(visit(), waitingWork([refused]))).toEqual(visit());
  });

  it('goes on from what the office has taken, though the page was drawn before', () => {
    const kept = visit('done', { arrivedAt: at(8), leftAt: at(12) });
    expect(furtherVisit(visit('booked'), kept)).toEqual(kept);
    expect(furtherVisit(kept, visit('booked'))).toEqual(kept);
    expect(furtherVisit(kept, null)).toEqual(kept);
  });

  it.each([
    ['done', true],
    ['missed', true],
    ['called-off', true],
    ['on-site', false],
    ['held', false],
  ] as const)('is over when it is %s: %s', (status, expected) => {
    expect(isOver(visit(status))).toBe(expected);
  });
});
