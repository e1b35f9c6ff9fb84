import { describe, expect, it } from 'vitest';
import { type CornerText, checkCorner } from '@/components/front/check-corner';

const inches: CornerText = { legLeft: '36', legRight: '48', diagonal: '60', depth: '24' };

describe('checkCorner', () => {
  it('finds a 3-4-5 corner square and within', () => {
    const { result } = checkCorner(inches, 'in');
    expect(result?.theta.value).toBeCloseTo(90, 9);
    expect(result?.offset?.value).toBeCloseTo(0, 9);
    expect(result?.share).toBe('within');
  });

  it('finds the left wall in the way where the diagonal is short', () => {
    // 36, 48, 59 3/8: θ = acos((1296 + 2304 − 3525.390625)/3456) = 88.763°; 24/tan θ = 0.5182 in.
    const { result } = checkCorner({ ...inches, diagonal: '59 3/8' }, 'in');
    expect(result?.theta.value).toBeCloseTo(88.763, 3);
    expect((result?.offset?.value ?? 0) / 25.4).toBeCloseTo(0.5182, 4);
    expect(result?.share).toBe('over');
  });

  it('says what square would read, and how far off that the diagonal is', () => {
    const { result } = checkCorner({ ...inches, diagonal: '59 3/8' }, 'in');
    expect((result?.squareMm ?? 0) / 25.4).toBeCloseTo(60, 9);
    expect((result?.offSquareMm ?? 0) / 25.4).toBeCloseTo(-0.625, 9);
  });

  it('reads millimetres and feet alike', () => {
    const typed = { legLeft: "3'", legRight: `4'`, diagonal: '1508.125', depth: '24"' };
    expect(checkCorner(typed, 'mm').result?.theta.value).toBeCloseTo(88.763, 3);
  });

  it('carries the limit to the depth that is asked about', () => {
    expect(checkCorner({ ...inches, depth: '12' }, 'in').result?.limitMm).toBeCloseTo(25.4 / 8, 9);
    const typed = { legLeft: '900', legRight: '1200', diagonal: '1500', depth: '300' };
    expect(checkCorner(typed, 'mm').result?.limitMm).toBeCloseTo(3, 9);
  });

  it('says at its field what cannot be a length, and reckons nothing', () => {
    const { errors, result } = checkCorner({ ...inches, diagonal: '34 3/2' }, 'in');
    expect(result).toBeNull();
    expect(Object.keys(errors)).toEqual(['diagonal']);
  });

  it('says what cannot be a corner', () => {
    const { notes, result } = checkCorner({ ...inches, diagonal: '99' }, 'in');
    expect(result).toBeNull();
    expect(notes.join()).toContain('longer than both legs');
  });

  it('takes a bay for what it is and gives no offset from square', () => {
    const { result } = checkCorner({ ...inches, diagonal: '77 1/2' }, 'in');
    expect(result?.theta.value).toBeGreaterThan(130);
    expect(result?.offset).toBeNull();
  });
});
