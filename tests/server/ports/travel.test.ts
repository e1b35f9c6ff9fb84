import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { type FakeTravel, startFakeTravel } from '@/server/ports/travel/fake-travel';
import { osrmTravel } from '@/server/ports/travel/osrm-travel';

const juniper = { lat: 41.284, lon: -58.312 };
const quayside = { lat: 41.217, lon: -58.312 };
const gannet = { lat: 41.322, lon: -58.232 };
const elsewhere = { lat: 40.7, lon: -74 };

let fake: FakeTravel;
const port = (given: { timeoutMs?: number; restMs?: number } = {}) =>
  osrmTravel({ baseUrl: fake.baseUrl, timeoutMs: 1_000, restMs: 0, ...given });

beforeEach(async () => {
  fake = await startFakeTravel();
});
afterEach(() => fake.stop());

describe('the table', () => {
  test('has a row for each start and a column for each end', async () => {
    const answer = await port().table({ from: [juniper, gannet], to: [quayside, juniper] });
    if (!answer.ok) throw new Error('no table');
    const [[toQuay = 0, stay = 1] = [], [fromGannet = 0, back = 0] = []] = answer.value;
    expect(stay).toBe(0);
    // Juniper Bend – sluice – Quayside: 5.03 km at 60 and 2.5 km at 50.
    expect(toQuay).toBeCloseTo(8.0, 0);
    // Gannet is behind Juniper Bend: the same road, with that much more before it.
    expect(fromGannet).toBeCloseTo(Number(back) + Number(toQuay), 0);
    expect(fake.asked()[0]).toBe(
      '/table/v1/driving/-58.312,41.284;-58.232,41.322;-58.312,41.217;-58.312,41.284?sources=0;1&destinations=2;3&annotations=duration',
    );
  });

  test('of more than the service takes at once is asked for in blocks and put together', async () => {
    const many = Array.from({ length: 70 }, (_, index) => ({
      lat: 41.25 + index / 2000,
      lon: -58.3,
    }));
    const answer = await port().table({ from: many, to: many });
    if (!answer.ok) throw new Error('no table');
    expect(fake.asked()).toHaveLength(4);
    expect(answer.value).toHaveLength(70);
    for (const [index, row] of answer.value.entries()) {
      expect(row).toHaveLength(70);
      expect(row[index]).toBe(0);
    }
    const direct = await port().table({ from: [many[3] ?? juniper], to: [many[61] ?? juniper] });
    expect(direct).toEqual({ ok: true, value: [[answer.value[3]?.[61]]] });
  });

  test('has no time to a place that no road reaches, and keeps all others', async () => {
    const answer = await port().table({
      from: [juniper, elsewhere],
      to: [elsewhere, quayside, elsewhere],
    });
    expect(answer).toEqual({
      ok: true,
      value: [
        [null, expect.any(Number), null],
        [null, null, null],
      ],
    });
  });
});

test('the route follows the roads and tells each leg', async () => {
  const answer = await port().route([juniper, quayside, gannet]);
  if (!answer.ok) throw new Error('no route');
  const { line, legMinutes } = answer.value;
  expect(legMinutes).toHaveLength(2);
  expect(line[0]).toEqual(juniper);
  expect(line.at(-1)).toEqual(gannet);
  expect(line).toContainEqual({ lat: 41.239, lon: -58.318 });
});

describe('faults of the road service', () => {
  const ask = { from: [juniper], to: [quayside] };

  test.each([
    [{ kind: 'refuse', status: 503 } as const, 'busy'],
    [{ kind: 'refuse', status: 429 } as const, 'busy'],
    [{ kind: 'refuse', status: 500 } as const, 'refused'],
    [{ kind: 'garbage' } as const, 'no-answer'],
    [{ kind: 'drop' } as const, 'unreachable'],
  ])('%o is told as %s, and the next question is answered', async (fault, reason) => {
    fake.faults.set(fault, { times: 1 });
    const travel = port();
    expect(await travel.table(ask)).toMatchObject({ ok: false, refusal: { reason } });
    expect(await travel.table(ask)).toMatchObject({ ok: true });
  });

  test('a slow one is given up', async () => {
    fake.faults.set({ kind: 'slow', delayMs: 1_000 }, { times: 1 });
    expect(await port({ timeoutMs: 100 }).table(ask)).toMatchObject({
      ok: false,
      refusal: { reason: 'no-answer' },
    });
  });

  test('one that did not answer is left alone for a while, so that nobody waits twice', async () => {
    fake.faults.set({ kind: 'drop' }, { times: 1 });
    const travel = port({ restMs: 60_000 });
    await travel.table(ask);
    expect(await travel.table(ask)).toMatchObject({
      ok: false,
      refusal: { reason: 'unreachable' },
    });
    expect(fake.asked()).toHaveLength(1);
  });
});
