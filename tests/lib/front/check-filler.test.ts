import { describe, expect, it } from 'vitest';
import { checkFiller } from '@/components/front/check-filler';

const mm = (top: string, middle: string, bottom: string) =>
  checkFiller({ top, middle, bottom }, 'mm');

describe('checkFiller', () => {
  it('leaves on the out-of-true, the doubt and the margin', () => {
    // 40 to 52: out of true 12, + U of the greatest (class II tape, under 1 m), + 3 margin: over 13.
    const { result } = mm('40', '46', '52');
    const uMm = result?.scribe.unrounded.u ?? 0;
    expect(uMm).toBeGreaterThan(0.5);
    expect(result?.scribe.governedBy).toBe('edge');
    expect(result?.blankMm).toBe(Math.ceil(40 + 12 + 2 * uMm + 3));
    expect(result?.taper.value).toBeCloseTo(-12, 9);
  });

  it('leaves on the least that is usual where the wall is true', () => {
    const { result } = mm('40', '40', '40');
    expect(result?.scribe.governedBy).toBe('least-scribe');
    expect(result?.blankMm).toBe(53);
    expect(result?.share).toBe('within');
  });

  it('flags a filler that is narrower than the least, and one wider than stock', () => {
    expect(mm('20', '22', '24').result?.share).toBe('over');
    expect(mm('70', '76', '80').result?.share).toBe('close');
  });

  it('cuts the blank to a sixteenth in an inch shop', () => {
    const text = { top: '1 13/16', middle: '1 7/8', bottom: '2 1/8' };
    const { result } = checkFiller(text, 'in');
    const sixteenths = (result?.blankMm ?? 0) / (25.4 / 16);
    expect(sixteenths).toBeCloseTo(Math.round(sixteenths), 9);
    expect(result?.blankMm).toBeGreaterThan(2.125 * 25.4);
  });

  it('says at its field what cannot be a length', () => {
    const { errors, result } = mm('40', 'x', '52');
    expect(result).toBeNull();
    expect(Object.keys(errors)).toEqual(['middle']);
  });
});
