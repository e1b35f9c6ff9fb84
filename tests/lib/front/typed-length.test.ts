import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { nudgedBy, typedIn, withSixteenths } from '@/components/front/typed-length';

describe('a length typed into a check', () => {
  it('is carried over when the unit changes, and comes back as it was', () => {
    expect(typedIn('34 1/2', 'in', 'mm')).toBe('876.3');
    expect(typedIn('900', 'mm', 'in')).toBe('35 7/16');
    fc.assert(
      fc.property(fc.integer({ min: 0, max: 2_000 }), (sixteenths) => {
        const text = withSixteenths(String(Math.floor(sixteenths / 16)), sixteenths % 16);
        expect(typedIn(typedIn(text, 'in', 'mm'), 'mm', 'in')).toBe(text);
      }),
      { seed: 2, numRuns: 100 },
    );
  });

  it('stays as it is while it is no length yet', () => {
    expect(typedIn('34 1/', 'in', 'mm')).toBe('34 1/');
    expect(typedIn('', 'mm', 'in')).toBe('');
  });

  it('takes its fraction by one touch, whatever stood there', () => {
    expect(withSixteenths('59', 6)).toBe('59 3/8');
    expect(withSixteenths('59 15/16', 0)).toBe('59');
    expect(withSixteenths('', 8)).toBe('1/2');
  });

  it('goes to the next mark of the tape, and not under nought', () => {
    expect(nudgedBy('59 15/16', 'in', 1)).toBe('60');
    expect(nudgedBy('1484', 'mm', -1)).toBe('1483');
    expect(nudgedBy('0', 'in', -1)).toBe('0');
  });
});
