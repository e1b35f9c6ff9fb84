import { describe, expect, it } from 'vitest';
import { readRules } from '@/components/rules/read-rules';
import { changeShopRulesInput, type ShopSettings } from '@/lib/contracts/shop-rules';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import {
  lengthListRules,
  lengthRuleGroups,
  shownLength,
  shownLengths,
} from '@/lib/rules/length-rules';
import { newUnit } from '@/lib/sheet/new-run';
import { fineLength } from '@/lib/sheet/reading-words';

const settings: ShopSettings = {
  ...defaultShopRules('US'),
  name: 'Juniper Bend',
  phone: '',
  email: '',
  region: 'US',
  zone: 'America/New_York',
};
const { fit } = settings;

/** The form as it is shown, with some of it typed anew. */
function typed(change: Record<string, string>): Record<string, string> {
  const lengths = lengthRuleGroups(fit.region).flatMap(({ rules }) =>
    rules.map(({ rule, isFine }) => [rule, shownLength(fit[rule], fit, isFine)] as const),
  );
  const lists = lengthListRules.map(({ rule }) => [rule, shownLengths(fit[rule], fit)] as const);
  return {
    ...Object.fromEntries([...lengths, ...lists]),
    unit: 'in',
    sheetNominalMm: fineLength(fit.sheetNominalMm, 'in'),
    sheetActualMm: '',
    crownSpringDeg: String(fit.crownSpringDeg),
    ...change,
  };
}

describe('sheet goods in the shop rules', () => {
  it('leaves a thickness that nobody touched exactly as it was', () => {
    const { body } = readRules(typed({}), settings);
    expect(body?.fit).toMatchObject({
      sheetNominalMm: fit.sheetNominalMm,
      sheetActualMm: null,
      crownSpringDeg: 38,
    });
  });

  it('reads what the sheet really measures, and the spring of the crown', () => {
    const { body } = readRules(
      typed({ sheetNominalMm: '3/4', sheetActualMm: '23/32', crownSpringDeg: '45' }),
      settings,
    );
    expect(body?.fit?.sheetNominalMm).toBeCloseTo(19.05, 6);
    expect(body?.fit?.sheetActualMm).toBeCloseTo(18.256, 2);
    expect(body?.fit?.crownSpringDeg).toBe(45);
    expect(changeShopRulesInput.safeParse({ fit: body?.fit }).success).toBe(true);
  });

  it('says beside the field what cannot be', () => {
    const { body, errors } = readRules(
      typed({ sheetActualMm: 'thin', crownSpringDeg: '90' }),
      settings,
    );
    expect(body).toBeNull();
    expect(Object.keys(errors).sort()).toEqual(['crownSpringDeg', 'sheetActualMm']);
  });

  it('counts an applied panel as one sheet, and a box as none', () => {
    const id = '00000000-0000-4000-8000-000000000001';
    expect(newUnit(fit, { id, kind: 'panel' }).sheets).toBe(1);
    expect(newUnit(fit, { id, kind: 'base' }).sheets).toBeUndefined();
  });
});
