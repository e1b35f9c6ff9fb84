import { afterEach, beforeEach, describe, expect, test } from 'vitest';
import { addressPlace } from '@/lib/island/demo-island';
import { type FakeGeocode, startFakeGeocode } from '@/server/ports/geocode/fake-geocode';
import { nominatimGeocode } from '@/server/ports/geocode/nominatim-geocode';

let fake: FakeGeocode;
const port = (given: { timeoutMs?: number; gapMs?: number } = {}) =>
  nominatimGeocode({
    baseUrl: fake.baseUrl,
    userAgent: 'Setwell (https://shop.example)',
    timeoutMs: 1_000,
    gapMs: 0,
    ...given,
  });
const ask = (text: string) => port().find({ text, country: null });

beforeEach(async () => {
  fake = await startFakeGeocode();
});
afterEach(() => fake.stop());

describe('an address', () => {
  test('with a number is found at its door', async () => {
    const { latitude, longitude } = addressPlace('Quay Rise', 14);
    expect(await ask('14 Quay Rise, Quayside')).toEqual({
      ok: true,
      places: [
        {
          lat: latitude,
          lon: longitude,
          label: '14 Quay Rise, Quayside, Fold County',
          nearness: 'house',
        },
      ],
    });
  });

  test('without one is found at its street, and a town alone in the town', async () => {
    expect(await ask('Quay Rise')).toMatchObject({ places: [{ nearness: 'street' }] });
    expect(await ask('Gannet')).toMatchObject({ places: [{ nearness: 'area' }] });
  });

  test('that nobody knows is no error', async () => {
    expect(await ask('1 Nowhere Lane')).toEqual({ ok: true, places: [] });
  });

  test('is looked for in the country of the shop', async () => {
    await port().find({ text: 'Quay Rise & Bell Steps', country: 'GB' });
    expect(fake.asked()).toEqual([
      '/search?q=Quay+Rise+%26+Bell+Steps&format=jsonv2&addressdetails=1&limit=5&countrycodes=gb',
    ]);
  });
});

test.each([
  [{ kind: 'refuse', status: 429 } as const, 'busy'],
  [{ kind: 'refuse', status: 403 } as const, 'refused'],
  [{ kind: 'garbage' } as const, 'no-answer'],
  [{ kind: 'drop' } as const, 'unreachable'],
])('a service with %o is told as %s', async (fault, reason) => {
  fake.faults.set(fault, { times: 1 });
  expect(await ask('14 Quay Rise')).toEqual({ ok: false, reason });
});

test('questions wait for their turn, and those too far back are told so at once', async () => {
  const geocode = port({ gapMs: 80 });
  const startedAt = performance.now();
  await Promise.all(['a', 'b', 'c'].map((text) => geocode.find({ text, country: null })));
  expect(performance.now() - startedAt).toBeGreaterThan(150);

  const patient = port({ gapMs: 6_000 });
  await patient.find({ text: 'a', country: null });
  expect(await patient.find({ text: 'b', country: null })).toEqual({ ok: false, reason: 'busy' });
});
