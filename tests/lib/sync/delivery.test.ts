import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { nextBatch } from '@/lib/sync/next-batch';
import type { Queued } from '@/lib/sync/queued';
import { type Answer, settleBatch } from '@/lib/sync/settle-batch';
import { exampleLength, exampleRoom, id, queuedExample } from '@/tests/help/wall-book-examples';

/** What can happen to one request, and when the phone can die. */
const fate = fc.constantFrom(
  'taken',
  'taken-but-answer-lost',
  'taken-but-phone-dies',
  'half-taken',
  'lost',
  'server-fault',
  'signed-out',
  'hotel-page',
  'slow-down',
);
type Fate = typeof fate extends fc.Arbitrary<infer T> ? T : never;
const step = fc.oneof(
  fc.record({ do: fc.constant('keep' as const), room: fc.integer({ min: 1, max: 2 }) }),
  fc.record({ do: fc.constant('send' as const), fate }),
  fc.record({ do: fc.constant('send-from-two-tabs' as const), fate }),
);

describe('the phone’s queue against an office that can fail in any way', () => {
  it('delivers each reading once and in order, whatever fails, dies or is sent twice', () => {
    fc.assert(
      fc.property(fc.array(step, { maxLength: 60 }), (steps) => {
        const office = new Office();
        let queue: Queued[] = [];
        const taken: string[] = [];
        for (const each of steps) {
          if (each.do === 'keep') {
            const reading = exampleLength(taken.length, { roomId: roomOf(each.room) });
            queue = [...queue, queuedExample(taken.length + 1, { kind: 'reading', reading })];
            taken.push(reading.id);
          } else if (each.do === 'send') {
            queue = sendOnce(queue, queue, office, each.fate);
          } else {
            const seenByBoth = queue;
            queue = sendOnce(queue, seenByBoth, office, 'taken');
            queue = sendOnce(queue, seenByBoth, office, each.fate);
          }
          const somewhere = new Set([...office.ids(), ...queue.map((item) => item.id)]);
          expect(taken.filter((reading) => !somewhere.has(reading))).toEqual([]);
        }
        for (let rest = 0; queue.length > 0 && rest < 200; rest += 1) {
          queue = sendOnce(queue, queue, office, 'taken');
        }
        expect(queue).toEqual([]);
        expect([...office.ids()].sort()).toEqual([...taken].sort());
        for (const room of [1, 2]) {
          const sent = office.inRoom(roomOf(room));
          expect(sent).toEqual(taken.filter((reading) => sent.includes(reading)));
        }
      }),
      { numRuns: 500 },
    );
  });
});

/** Append-only and idempotent, as `recordReadings` is. */
class Office {
  private readonly lines = new Map<string, string>();

  take(readings: { id: string; roomId: string }[]): void {
    for (const reading of readings) {
      if (!this.lines.has(reading.id)) this.lines.set(reading.id, reading.roomId);
    }
  }

  ids(): string[] {
    return [...this.lines.keys()];
  }

  inRoom(roomId: string): string[] {
    return [...this.lines].filter(([, room]) => room === roomId).map(([reading]) => reading);
  }
}

/** `stored` is what the phone's disk holds now, `seen` what this tab read from it before sending. */
function sendOnce(stored: Queued[], seen: Queued[], office: Office, what: Fate): Queued[] {
  const batch = nextBatch(seen, 'ann');
  if (!batch) return stored;
  const readings = batch.items.flatMap(({ work }) =>
    work.kind === 'reading' ? [work.reading] : [],
  );
  const reached =
    what === 'half-taken' ? readings.slice(0, Math.ceil(readings.length / 2)) : readings;
  if (what.startsWith('taken') || what === 'half-taken') office.take(reached);
  if (what === 'taken-but-phone-dies') return stored;
  const settled = settleBatch(batch, answerOf(what, reached));
  const gone = new Set(settled.sentIds);
  expect(settled.parked).toEqual([]);
  return stored.filter((item) => !gone.has(item.id));
}

function answerOf(what: Fate, reached: { id: string }[]): Answer {
  switch (what) {
    case 'taken':
    case 'half-taken':
      return { status: 200, json: { accepted: reached.map((each) => each.id), parked: [] } };
    case 'server-fault':
      return { status: 500, json: { title: 'Something went wrong', status: 500 } };
    case 'signed-out':
      return { status: 401, json: null };
    case 'hotel-page':
      return { status: 200, json: null };
    case 'slow-down':
      return { status: 429, json: null };
    default:
      return 'no-answer';
  }
}

function roomOf(number: number): string {
  return number === 1 ? exampleRoom.id : id(90);
}
