/** Times that work for 20 crews over 90 days with 5,000 booked visits, and how the time grows with each of them. */
import { noWishes } from '@/lib/contracts/openings';
import { crewCalendar, findOpenings, usualOpeningWeights } from '@/lib/schedule';
import { seededRandom } from '@/lib/schedule/routes/seeded-random';
import { addDays } from '@/lib/time/civil';
import { fromLocal } from '@/lib/time/local-moment';

const zone = 'America/New_York';
const from = '2026-05-11';
const hours = [1, 2, 3, 4, 5].map((weekday) => ({ weekday, start: '08:00', end: '16:00' }));
const pattern = { weeks: [hours], firstWeekOf: from };

/** Every visit of ninety minutes on the quarter, at one of 400 places; some overlap, as people's other crews do. */
function question(size: { crews: number; days: number; visits: number; workMinutes: number }) {
  const random = seededRandom(1);
  const pick = (count: number) => Math.floor(random() * count);
  const busy = Array.from({ length: size.crews }, (): BusyPieces => []);
  for (let count = 0; count < size.visits; count += 1) {
    const startsAt = new Date(
      fromLocal(addDays(from, pick(size.days)), '08:00', zone).getTime() + pick(26) * 900_000,
    );
    const endsAt = new Date(startsAt.getTime() + 5_400_000);
    busy[pick(size.crews)]?.push({ startsAt, endsAt, place: pick(400), label: 'stop' });
  }
  return {
    crews: busy.map((pieces, index) => ({
      id: `${index}`,
      name: `Crew ${index}`,
      calendar: crewCalendar({ pattern, closedDays: [] }),
      base: index,
      busy: pieces,
      workMinutes: size.workMinutes,
    })),
    site: 7,
    driveMinutes: (a: number, b: number) => Math.abs((a * 37) % 60) - ((b * 37) % 60) + 60,
    driveWhenUnknownMinutes: 20,
    from,
    until: addDays(from, size.days - 1),
    now: fromLocal(from, '07:00', zone),
    zone,
    windowMinutes: 120,
    wishes: { ...noWishes, weekdays: [2, 4], notBefore: '09:30' },
    weights: usualOpeningWeights,
  };
}
type BusyPieces = { startsAt: Date; endsAt: Date; place: number; label: string }[];

const table: Record<string, object> = {};
const usual = { crews: 20, days: 90, visits: 5_000, workMinutes: 90 };
for (const [name, size] of Object.entries({
  'a measure: 20 crews, 90 days, 5,000 visits': usual,
  'an install of five days, 600 visits': { ...usual, visits: 600, workMinutes: 2_400 },
  'crews × 4': { ...usual, crews: 80, visits: 20_000 },
  'crews × 16': { ...usual, crews: 320, visits: 80_000 },
  'days × 4': { ...usual, days: 360, visits: 20_000 },
  'days × 16': { ...usual, days: 1_440, visits: 80_000 },
  'visits × 4': { ...usual, visits: 20_000 },
  'visits × 16': { ...usual, visits: 80_000 },
})) {
  const asked = question(size);
  const times: number[] = [];
  let found = 0;
  for (let tries = 0; tries < (size.crews * size.days > 10_000 ? 3 : 15); tries += 1) {
    const began = performance.now();
    found = findOpenings(asked).length;
    times.push(performance.now() - began);
  }
  times.sort((a, b) => a - b);
  table[name] = { median: `${times[Math.floor(times.length / 2)]?.toFixed(1)} ms`, found };
}
console.table(table);
