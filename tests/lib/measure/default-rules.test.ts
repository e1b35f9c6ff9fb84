import { describe, expect, it } from 'vitest';
import { bookingRules, fitRules, shopRules } from '@/lib/contracts/shop-rules';
import { bookingRuleBasis, fitRuleBasis } from '@/lib/measure/rules/default-basis';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { PRACTICE_SOURCES } from '@/lib/measure/rules/practice-sources';

const regions = ['US', 'UK', 'AU', 'EU'] as const;

describe('default shop rules', () => {
  it.each(regions)('gives a %s shop rules that its own schema accepts unchanged', (region) => {
    const rules = defaultShopRules(region);
    expect(shopRules.parse(rules)).toEqual(rules);
    expect(rules.fit.region).toBe(region);
  });

  it.each(regions)('keeps least and most in order for a %s shop', (region) => {
    const { fit } = defaultShopRules(region);
    expect(fit.fillerLeastMm).toBeLessThan(fit.fillerMostMm);
    expect(fit.legMinMm).toBeLessThan(fit.kickHeightMm);
    expect(fit.kickHeightMm).toBeLessThan(fit.legMaxMm);
    expect(fit.baseTopMm).toBeLessThan(fit.counterTopMm);
    const widths = fit.studsNeeded.map((row) => row.toWidthMm);
    expect([...widths].sort((a, b) => a - b)).toEqual(widths);
  });

  it('keeps whole sixteenths exact in an inch shop', () => {
    const { fit } = defaultShopRules('US');
    expect(fit.stepMm).toBe(1.5875);
    expect(fit.baseTopMm).toBe(876.3);
    expect(fit.counterTopMm).toBe(914.4);
  });

  it('gives each shop its own copy', () => {
    defaultShopRules('US').fit.studSpacingsMm.push(1);
    expect(defaultShopRules('US').fit.studSpacingsMm).toEqual([406.4, 609.6]);
  });

  it('states a basis for every rule, and says so where there is no source', () => {
    expect(Object.keys(fitRuleBasis).sort()).toEqual(Object.keys(fitRules.shape).sort());
    expect(Object.keys(bookingRuleBasis).sort()).toEqual(Object.keys(bookingRules.shape).sort());
    for (const basis of Object.values(fitRuleBasis)) {
      if (basis.sources.length === 0) expect(basis.note).toMatch(/no source/);
      else for (const source of basis.sources) expect(PRACTICE_SOURCES[source]?.title).toBeTruthy();
    }
  });
});
