import type { ChangeShopRulesInput, ShopSettings } from '@/lib/contracts/shop-rules';
import { lengthRuleGroups } from '@/lib/rules/length-rules';
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
