import { describe, expect, it } from 'vitest';
import { checkWall } from '@/components/front/check-wall';

const mm = (way: 'along' | 'up', gaps: string[]) => checkWall({ way, spacing: '300', gaps }, 'mm');

describe('checkWall', () => {
  it('calls a wall hollow where the gap is in the middle', () => {
    const { result } = mm('along', ['0', '2', '4', '2', '0', '', '']);
    expect(result?.straight.shape).toBe('hollow');
    expect(result?.straight.minimumZone.value).toBeCloseTo(4, 9);
    expect(result?.lengthMm).toBe(1200);
    expect(result?.plumb).toBeNull();
  });

  it('calls it a bulge where the gaps are at the ends', () => {
    expect(mm('along', ['5', '2', '0', '2', '5', '', '']).result?.straight.shape).toBe('bulge');
  });

  it('finds which way a wall leans from a level that stands plumb', () => {
    // Gaps grow upward: the wall falls back, so it leans out: 8 mm over 1200.
    const { result } = mm('up', ['0', '2', '4', '6', '8', '', '']);
    expect(result?.plumb?.leans).toBe('out');
    expect(result?.plumb?.over.value).toBeCloseTo(-8, 9);
    expect(result?.plumbShare).toBe('over');
    expect(result?.straightShare).toBe('within');
  });

  it('leaves out a place that was not read', () => {
    const { result } = mm('along', ['0', '', '4', '', '0', '', '']);
    expect(result?.points.map(({ atMm }) => atMm)).toEqual([0, 600, 1200]);
  });

  it('asks for three places', () => {
    const { result, notes } = mm('along', ['0', '', '', '', '3', '', '']);
    expect(result).toBeNull();
    expect(notes.join()).toContain('three places');
  });

  it('says which gap is no length', () => {
    const { result, gapErrors } = mm('along', ['0', 'x', '4', '', '0', '', '']);
    expect(result).toBeNull();
    expect(gapErrors.findIndex(Boolean)).toBe(1);
  });
});
