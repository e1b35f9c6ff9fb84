import type { ChangeShopRulesInput, FitRules, ShopSettings } from '@/lib/contracts/shop-rules';
import { lengthRuleGroups } from '@/lib/rules/length-rules';
import { fineLength } from '@/lib/sheet/reading-words';
import { formatLength } from '@/lib/units/format-length';
import { parseLength } from '@/lib/units/parse-length';

type Read = { body: ChangeShopRulesInput | null; errors: Record<string, string> };

/**
 * The form's texts as rules. A length left as it was shown keeps its exact value, so that saving a form
 * does not round a rule that nobody touched.
 */
export function readRules(fields: Record<string, string>, before: ShopSettings): Read {
  const { fit, booking } = before;
  const errors: Record<string, string> = {};
  const nextFit = { ...fit, unit: fields.unit === 'mm' ? ('mm' as const) : ('in' as const) };
  nextFit.stepMm = Number(fields.step) || fit.stepMm;
  nextFit.scribeStepMm = nextFit.stepMm;
  for (const { rule } of lengthRuleGroups.flatMap((group) => group.rules)) {
    const typed = fields[rule] ?? '';
    if (typed === formatLength(fit[rule], { unit: fit.unit, stepMm: fit.stepMm })) continue;
    const { value, problems } = parseLength(typed, { unit: fit.unit });
    if (value === null) errors[rule] = problems[0]?.message ?? 'That is no length.';
    else nextFit[rule] = value;
  }
  readSheetGoods(fields, { fit, nextFit, errors });
  if (Object.keys(errors).length > 0) return { body: null, errors };
  const { name = '', phone = '', email = '', zone = '' } = fields;
  return {
    errors,
    body: {
      name,
      phone,
      email,
      zone,
      fit: nextFit,
      keeping: { customerYears: Number(fields.customerYears) || null },
      booking: {
        ...booking,
        dayStart: fields.dayStart ?? booking.dayStart,
        dayEnd: fields.dayEnd ?? booking.dayEnd,
        quietFrom: fields.quietFrom ?? booking.quietFrom,
        quietUntil: fields.quietUntil ?? booking.quietUntil,
        workdays: [1, 2, 3, 4, 5, 6, 7].filter((day) => fields[`workday${day}`] === 'yes'),
        closedDays: (fields.closedDays ?? '').split(/[\s,]+/).filter(Boolean),
        windowMinutes: Number(fields.windowMinutes),
        leadWorkdays: Number(fields.leadWorkdays),
        weightDriveMinute: Number(fields.weightDriveMinute),
        weightDayWaited: Number(fields.weightDayWaited),
        weightScrapMinute: Number(fields.weightScrapMinute),
        weightMissedWish: Number(fields.weightMissedWish),
      },
    },
  };
}

type SheetGoods = { fit: FitRules; nextFit: FitRules; errors: Record<string, string> };

/** A sheet is read to 1/64 in or 0.1 mm; left as it was shown it keeps its exact thickness. */
function readSheetGoods(fields: Record<string, string>, { fit, nextFit, errors }: SheetGoods) {
  const read = (rule: 'sheetNominalMm' | 'sheetActualMm'): number | null => {
    const typed = (fields[rule] ?? '').trim();
    const before = fit[rule];
    if (typed === (before === null ? '' : fineLength(before, fit.unit))) return before;
    if (typed === '' && rule === 'sheetActualMm') return null;
    const { value, problems } = parseLength(typed, { unit: fit.unit });
    if (value === null) errors[rule] = problems[0]?.message ?? 'That is no thickness.';
    return value;
  };
  nextFit.sheetNominalMm = read('sheetNominalMm') ?? fit.sheetNominalMm;
  nextFit.sheetActualMm = read('sheetActualMm');
  const springDeg = Number(fields.crownSpringDeg ?? fit.crownSpringDeg);
  if (springDeg > 0 && springDeg < 90) nextFit.crownSpringDeg = springDeg;
  else errors.crownSpringDeg = 'Between 0 and 90 degrees.';
}
