import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { database } from '@/server/base/database';
import type { CustomerVisit } from '@/server/visits/read-customer-visit';
import { type CalendarMethod, visitCalendar } from '@/server/visits/visit-calendar';
import { readCalendar } from '../help/strict-calendar';

const visit: CustomerVisit = {
  id: '6f6a2d0e-6f0b-4a53-9d0d-0d2b4b8f6a01',
  version: 1,
  kind: 'install',
  status: 'booked',
  startsAt: new Date('2027-03-13T13:00:00Z'),
  endsAt: new Date('2027-03-15T19:30:00Z'),
  windowStartsAt: new Date('2027-03-13T13:00:00Z'),
  windowEndsAt: new Date('2027-03-13T15:00:00Z'),
  expectedAt: null,
  customerSays: '',
  jobId: '6f6a2d0e-6f0b-4a53-9d0d-0d2b4b8f6a02',
  customerId: '6f6a2d0e-6f0b-4a53-9d0d-0d2b4b8f6a03',
  notReady: '',
  customerName: 'Rosa Quill',
  email: 'rosa@customer.example',
  language: 'en',
  street: '12 Alder Row',
  town: 'Fernhollow',
  zone: 'America/New_York',
  yearBuilt: null,
};

async function fileOf(
  method: CalendarMethod,
  change: Partial<CustomerVisit> = {},
  shopName = 'Juniper Bend',
) {
  const { db } = await database();
  const ctx = {
    shop: {
      id: 'shop',
      name: shopName,
      phone: '+12125550142',
      email: 'office@shop.example',
      region: 'US' as const,
      zone: 'America/New_York',
      rules: defaultShopRules('US'),
    },
    actor: { kind: 'system' as const, name: 'Setwell' },
    db,
    now: new Date('2027-01-01T12:00:00Z'),
    log: () => {},
  };
  const link = 'http://localhost:3000/v/7hK2mXqP9sRtV4wYbN6cDf';
  return visitCalendar(ctx, { ...visit, ...change }, { method, link });
}

describe('a visit as a calendar file', () => {
  it.each(['REQUEST', 'CANCEL', 'PUBLISH'] as const)(
    'keeps RFC 5545 and 5546 to the letter with METHOD %s',
    async (method) => {
      const { lines, wrong } = readCalendar(await fileOf(method));
      expect(wrong).toEqual([]);
      expect(lines.find(({ name }) => name === 'METHOD')?.value).toBe(method);
    },
  );

  it('is the same entry after a move, and after it is called off, each later than the one before', async () => {
    const files = [
      await fileOf('REQUEST'),
      await fileOf('REQUEST', { version: 2, startsAt: new Date('2027-03-14T12:00:00Z') }),
      await fileOf('CANCEL', { version: 3 }),
    ].map((file) => readCalendar(file).lines);
    const all = (name: string) =>
      files.map((lines) => lines.find((line) => line.name === name)?.value);
    expect(new Set(all('UID')).size).toBe(1);
    expect(all('SEQUENCE')).toEqual(['1', '2', '3']);
    expect(all('STATUS')).toEqual(['CONFIRMED', 'CONFIRMED', 'CANCELLED']);
    // Across the night on which the clocks change, in instants.
    expect(all('DTSTART')).toEqual(['20270313T130000Z', '20270314T120000Z', '20270313T130000Z']);
    expect(all('DTEND')[0]).toBe('20270315T193000Z');
  });

  it('lets no name, whatever is in it, become a line or a person of its own', async () => {
    const nasty = fc.string({
      unit: fc.constantFrom('a', 'é', 'ж', '😀', ' ', '\n', '\r', '"', ';', ':', ',', '\\', '='),
      maxLength: 90,
    });
    await fc.assert(
      fc.asyncProperty(nasty, nasty, nasty, async (customerName, street, shopName) => {
        const file = await fileOf('REQUEST', { customerName, street }, shopName);
        const { lines, wrong } = readCalendar(file);
        expect(wrong).toEqual([]);
        for (const name of ['ATTENDEE', 'ORGANIZER', 'SUMMARY', 'BEGIN', 'UID'] as const) {
          const count = lines.filter((line) => line.name === name).length;
          expect(count).toBe(name === 'BEGIN' ? 2 : 1);
        }
        const attendee = lines.find(({ name }) => name === 'ATTENDEE');
        expect(attendee?.value.toLowerCase()).toBe('mailto:rosa@customer.example');
      }),
      { numRuns: 60 },
    );
  });
});
