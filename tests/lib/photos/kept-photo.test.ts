import { describe, expect, it } from 'vitest';
import { type KeptPhoto, nextPhoto, outlivedPhotos } from '@/lib/photos/kept-photo';

const now = Date.parse('2026-12-01T12:00:00.000Z');
const photo = (id: string, change: Partial<KeptPhoto> = {}): KeptPhoto => ({
  id,
  personId: 'ann',
  roomId: 'kitchen',
  wallId: null,
  takenAt: '2026-12-01T11:59:00.000Z',
  place: 'Wall B',
  clean: null,
  marks: [],
  marked: null,
  isDone: true,
  sentAt: null,
  parked: null,
  widthPx: 16,
  heightPx: 12,
  ...change,
});
const next = (...photos: KeptPhoto[]) =>
  nextPhoto(photos, { personId: 'ann', nowMs: now })?.id ?? null;

describe('the photo to send next', () => {
  it('is the oldest of one’s own that waits', () => {
    const older = photo('b', { takenAt: '2026-12-01T09:00:00.000Z' });
    expect(next(photo('a'), older)).toBe('b');
    expect(next(photo('c', { personId: 'ben' }))).toBe(null);
  });

  it('is none that the office has or refused', () => {
    expect(next(photo('a', { sentAt: '2026-12-01T11:59:30.000Z' }))).toBe(null);
    expect(next(photo('b', { parked: 'No such room.' }))).toBe(null);
  });

  it('is not one that is being marked, until it was left alone for a quarter of an hour', () => {
    expect(next(photo('a', { isDone: false }))).toBe(null);
    expect(next(photo('a', { isDone: false, takenAt: '2026-12-01T11:45:00.000Z' }))).toBe('a');
  });
});

describe('photos that the phone lets go of', () => {
  it('are those that the office has had for a day and a half', () => {
    const sent = (sentAt: string | null) => photo(sentAt ?? 'waits', { sentAt });
    const old = sent('2026-11-29T23:00:00.000Z');
    expect(outlivedPhotos([old, sent('2026-12-01T08:00:00.000Z'), sent(null)], now)).toEqual([
      old.id,
    ]);
  });
});
