import { describe, expect, it } from 'vitest';
import { compareRevisions, nextRevision } from '@/lib/sheet/next-revision';

describe('nextRevision', () => {
  it.each([
    [null, 'A'],
    ['A', 'B'],
    ['Y', 'Z'],
    ['Z', 'AA'],
    ['AZ', 'BA'],
    ['ZZ', 'AAA'],
  ])('follows %s with %s', (newest, next) => {
    expect(nextRevision(newest)).toBe(next);
  });

  it('never repeats a letter and always sorts after the one before', () => {
    const seen: string[] = [];
    for (let newest: string | null = null; seen.length < 800; newest = seen.at(-1) ?? null) {
      const next = nextRevision(newest);
      if (newest) expect(compareRevisions(newest, next)).toBeLessThan(0);
      seen.push(next);
    }
    expect(new Set(seen).size).toBe(seen.length);
  });
});
