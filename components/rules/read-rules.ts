import type { ChangeShopRulesInput, FitRules, ShopSettings } from '@/lib/contracts/shop-rules';
import {
  lengthListRules,
  lengthRuleGroups,
  shownLength,
  shownLengths,
} from '@/lib/rules/length-rules';
import { fineLength } from '@/lib/sheet/reading-words';
import { parseLength } from '@/lib/units/parse-length';
import { typedSpeed } from './drive-speed';

type Fields = Record<string, string>;
type Read = { body: ChangeShopRulesInput | null; errors: Record<string, string> };
type Reading = { fit: FitRules; nextFit: FitRules; errors: Record<string, string> };

/**
 * The form's texts as rules. A length left as it was shown keeps its exact value, so that saving a form
 * does not round a rule that nobody touched.
 */
export function readRules(fields: Fields, before: ShopSettings): Read {
  const { fit } = before;
  const errors: Record<string, string> = {};
  const nextFit = { ...fit, unit: fields.unit === 'mm' ? ('mm' as const) : ('in' as const) };
  nextFit.stepMm = Number(fields.step) || fit.stepMm;
  nextFit.scribeStepMm = nextFit.stepMm;
  if (fields.fillerPlane) {
    nextFit.fillerPlane = fields.fillerPlane === 'carcass-front' ? 'carcass-front' : 'door-front';
  }
  const reading = { fit, nextFit, errors };
  readLengths(fields, reading);
  readLengthLists(fields, reading);
  readSheetGoods(fields, reading);
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
      booking: readBooking(fields, before),
    },
  };
}

function readBooking(fields: Fields, { booking, region }: ShopSettings) {
  return {
    ...booking,
    dayStart: fields.dayStart ?? booking.dayStart,
    dayEnd: fields.dayEnd ?? booking.dayEnd,
    quietFrom: fields.quietFrom ?? booking.quietFrom,
    quietUntil: fields.quietUntil ?? booking.quietUntil,
    workdays: [1, 2, 3, 4, 5, 6, 7].filter((day) => fields[`workday${day}`] === 'yes'),
    windowMinutes: Number(fields.windowMinutes),
    leadWorkdays: Number(fields.leadWorkdays),
    measureMinutesPerRoom: Number(fields.measureMinutesPerRoom),
    installMinutesPerUnit: Number(fields.installMinutesPerUnit),
    driveKmPerHour: typedSpeed(fields.driveSpeed ?? '', booking.driveKmPerHour, region),
    weightDriveMinute: Number(fields.weightDriveMinute),
    weightDayWaited: Number(fields.weightDayWaited),
    weightScrapMinute: Number(fields.weightScrapMinute),
    weightMissedWish: Number(fields.weightMissedWish),
  };
}

function readLengths(fields: Fields, { fit, nextFit, errors }: Reading) {
  for (const { rule, isFine } of lengthRuleGroups(fit.region).flatMap(({ rules }) => rules)) {
    const typed = fields[rule] ?? '';
    if (typed === shownLength(fit[rule], fit, isFine)) continue;
    const { value, problems } = parseLength(typed, { unit: fit.unit });
    if (value === null) errors[rule] = problems[0]?.message ?? 'That is no length.';
    else nextFit[rule] = value;
  }
}

function readLengthLists(fields: Fields, { fit, nextFit, errors }: Reading) {
  for (const { rule } of lengthListRules) {
    const typed = fields[rule] ?? '';
    if (typed === shownLengths(fit[rule], fit)) continue;
    const read = typed
      .split(/,|;/)
      .filter((text) => text.trim() !== '')
      .map((text) => parseLength(text, { unit: fit.unit }));
    const wrong = read.find(({ value }) => value === null);
    if (wrong) errors[rule] = wrong.problems[0]?.message ?? 'One of these is no length.';
    else nextFit[rule] = read.flatMap(({ value }) => (value === null ? [] : [value]));
  }
}

/** A sheet is read to 1/64 in or 0.1 mm; left as it was shown it keeps its exact thickness. */
function readSheetGoods(fields: Fields, { fit, nextFit, errors }: Reading) {
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
