import { describe, expect, it } from 'vitest';
import { PS_1_CATEGORIES, sheetLimits } from '@/lib/measure/rules/sheet-limits';
import data from './data/sheet-goods.json';

const nominalInches = (category: string) => {
  const [whole, fraction] = category.includes('-') ? category.split('-') : ['0', category];
  const [over = 0, under = 1] = (fraction ?? '0').split('/').map(Number);
  return Number(whole) + over / under;
};

describe('sheet thickness limits as published', () => {
  it.each(data['ps1-performance-category'].rows)(
    'keeps PS 1 category %s from %d to %d in',
    (...row) => {
      const [category, least, most] = [String(row[0]), Number(row[1]), Number(row[2])];
      const limits = sheetLimits('PS 1', nominalInches(category) * 25.4);
      expect(limits?.leastMm).toBeCloseTo(least * 25.4, 9);
      expect(limits?.mostMm).toBeCloseTo(most * 25.4, 9);
    },
  );

  it('lists every category and no other', () => {
    expect(PS_1_CATEGORIES.map(([name]) => name)).toEqual(
      data['ps1-performance-category'].rows.map(([name]) => name),
    );
    expect(sheetLimits('PS 1', 17)).toBeNull();
  });

  it('agrees with the published millimetres', () => {
    for (const [category, [least, most]] of Object.entries(
      data['ps1-performance-category'].mm_examples,
    )) {
      const limits = sheetLimits('PS 1', nominalInches(category) * 25.4);
      // The published millimetres are those of the category ∓ 1/32 in before it was rounded.
      expect(Math.abs((limits?.leastMm ?? 0) - (least ?? 0))).toBeLessThan(0.03);
      expect(Math.abs((limits?.mostMm ?? 0) - (most ?? 0))).toBeLessThan(0.03);
    }
  });

  it('follows the EN 315 formula for sanded plywood', () => {
    for (const [key, [plus, minus]] of Object.entries(data['en315-formula'].computed_here)) {
      const nominal = Number(key.split('_')[0]);
      const limits = sheetLimits('EN 315', nominal);
      expect((limits?.mostMm ?? 0) - nominal).toBeCloseTo(plus ?? 0, 9);
      expect(nominal - (limits?.leastMm ?? 0)).toBeCloseTo(minus ?? 0, 9);
    }
  });
});
