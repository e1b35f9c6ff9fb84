import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { ChangeShopRulesInput } from '@/lib/contracts/shop-rules';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { changeBack } from '@/lib/rules/change-back';

const rules = defaultShopRules('US');
const shop = { name: 'Juniper Bend', phone: '', email: '', zone: 'America/New_York', ...rules };

/** The rules after a change, as the server keeps them. */
const changed = (before: typeof shop, given: ChangeShopRulesInput): typeof shop => ({
  ...before,
  ...(given as Partial<typeof shop>),
});

describe('a change of the rules, put back', () => {
  it('leaves what was changed after it', () => {
    const first = { booking: { ...rules.booking, windowMinutes: 90 } };
    const afterFirst = changed(shop, first);
    const second = {
      booking: { ...afterFirst.booking, dayStart: '07:00' },
      name: 'Juniper Bend 2',
    };
    const now = changed(afterFirst, second);
    expect(changeBack(now, { before: shop, given: first })).toEqual({
      booking: { ...rules.booking, windowMinutes: 120, dayStart: '07:00' },
    });
  });

  it('goes back to the usual where nothing of the shop’s own was said before', () => {
    const given = { keeping: { customerYears: 7 }, checklists: { install: [] } };
    expect(changeBack(changed(shop, given), { before: shop, given })).toEqual({
      keeping: { customerYears: null },
      checklists: {},
    });
  });

  it('makes the rules what they were when nothing came after', () => {
    const someFit = fc.record({
      fillerLeastMm: fc.double({ min: 5, max: 30, noNaN: true }),
      plumbFlagMm: fc.double({ min: 1, max: 12, noNaN: true }),
    });
    fc.assert(
      fc.property(someFit, fc.integer({ min: 15, max: 480 }), (fit, windowMinutes) => {
        const given = {
          fit: { ...rules.fit, ...fit },
          booking: { ...rules.booking, windowMinutes },
        };
        const now = changed(shop, given);
        expect(changed(now, changeBack(now, { before: shop, given }))).toEqual(shop);
      }),
    );
  });
});
