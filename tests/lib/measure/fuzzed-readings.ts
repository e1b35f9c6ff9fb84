/** Readings of any shape and number, as a broken phone or a hostile one might send them. */
import type { Reading } from '@/lib/contracts/readings';
import type { WallBook } from '@/lib/contracts/wall-book';
import type { Random } from './random-room';
import { countedId } from './true-room';

const STRANGE: unknown[] = [
  0,
  -0,
  -1,
  1e-9,
  1e-300,
  1e5,
  1e6,
  1e12,
  -1e9,
  359.999,
  360,
  Number.NaN,
  Infinity,
  -Infinity,
  null,
  undefined,
  '',
  '900',
  'NaN',
  true,
  [],
  {},
  [900],
  { valueMm: 1 },
  '\0',
  '\ud800',
  12n,
];
/** Fields that say of what a reading is; a true id, a strange one, or none. */
const WHERE = [
  'wallId',
  'toWallId',
  'cornerWallId',
  'fromCornerWallId',
  'toCornerWallId',
  'setUpId',
];

const pick = <T>(random: Random, from: readonly T[]): T | undefined =>
  from[Math.floor(random.uniform() * from.length)];

/** A reading of the book with some of its fields made strange, or left out, or taken from another kind. */
export function fuzzedReading(random: Random, book: WallBook, n: number): Record<string, unknown> {
  const like: Record<string, unknown> = { ...pick(random, book.readings) };
  const other: Record<string, unknown> = { ...pick(random, book.readings) };
  like.id = countedId(500_000 + n);
  const fields = Object.keys({ ...like, ...other });
  const spoils = 1 + Math.floor(random.uniform() ** 2 * 3);
  for (let i = 0; i < spoils; i++) {
    const field = pick(random, fields) ?? 'valueMm';
    if (field !== 'id') spoil(random, like, field, other);
  }
  return like;
}

/** A length or diagonal of the book with a number that cannot be it, and that a contract must let through. */
export function grossSlip(
  random: Random,
  book: WallBook,
  n: number,
): { of: Reading; slipped: Reading } {
  const taped = book.readings.filter(({ kind }) => kind === 'length' || kind === 'diagonal');
  const of = pick(random, taped);
  if (!of || !('valueMm' in of)) throw new Error('The book holds no length.');
  const off = random.between(100, 2_000) * (random.uniform() < 0.5 ? -1 : 1);
  const valueMm = of.valueMm + off > 0 ? of.valueMm + off : of.valueMm - off;
  return { of, slipped: { ...of, id: countedId(500_000 + n), valueMm } };
}

function spoil(
  random: Random,
  like: Record<string, unknown>,
  field: string,
  other: Record<string, unknown>,
): void {
  const chance = random.uniform();
  if (field === 'by' && typeof like.by === 'object' && chance < 0.8) {
    const by: Record<string, unknown> = { ...like.by };
    spoil(random, by, pick(random, Object.keys(by)) ?? 'method', {});
    like.by = by;
  } else if (chance < 0.05) delete like[field];
  else if (chance < 0.15) like[field] = other[field];
  else if (WHERE.includes(field) && chance < 0.8) {
    like[field] = countedId(100 + Math.floor(random.uniform() * 8));
  } else if (typeof like[field] === 'number' && chance < 0.9) {
    // A number that could be one: what the contract must let through and the engine make sense of.
    like[field] = pick(random, [
      random.between(-5_000, 12_000),
      random.between(0, 400),
      Number(like[field]) + random.between(-300, 300),
      -Number(like[field]),
      Number(like[field]) * 10,
    ]);
  } else like[field] = pick(random, STRANGE);
}

/** Paths of numbers that are not finite. */
export function notNumbers(value: unknown, path = ''): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [path];
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, inner]) => notNumbers(inner, `${path}/${key}`));
}
