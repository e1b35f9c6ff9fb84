import type { FitRules, ShopRules } from '@/lib/contracts/shop-rules';
import { fineLength } from '@/lib/sheet/reading-words';
import { tradeWord } from '@/lib/words/trade';
import { lengthListRules, lengthRuleGroups, shownLength, shownLengths } from './length-rules';

export type RuleChange = { label: string; from: string; to: string; affects: string };

type Settings = ShopRules & { name?: string; phone?: string; email?: string; zone?: string };

const others: Record<string, { label: string; affects: string }> = {
  name: { label: 'Name', affects: 'messages, sheets' },
  phone: { label: 'Phone', affects: 'messages, the customer’s page' },
  email: { label: 'E-mail', affects: 'messages, the customer’s page' },
  zone: { label: 'Time zone', affects: 'every time of day that is shown from now on' },
  'fit.unit': { label: 'Lengths', affects: 'what is typed and shown' },
  'fit.stepMm': { label: 'Cut sizes to', affects: 'blanks, openings' },
  'fit.ruleSet': { label: 'Rule set', affects: 'verdicts' },
  'fit.fillerPlane': { label: 'Plane of the fillers', affects: 'where a width counts' },
  'fit.ownRuleSets': { label: 'The shop’s own rule sets', affects: 'verdicts' },
  'booking.dayStart': { label: 'Day starts', affects: 'times that are offered' },
  'booking.dayEnd': { label: 'Day ends', affects: 'times that are offered, length of installs' },
  'booking.workdays': { label: 'Days worked', affects: 'times that are offered' },
  'booking.closedDays': { label: 'Closed days', affects: 'times that are offered' },
  'booking.windowMinutes': { label: 'Arrival window', affects: 'what customers are promised' },
  'booking.holidays': { label: 'Public holidays', affects: 'times that are offered' },
  'booking.measureMinutesPerRoom': {
    label: 'To measure a kitchen, minutes',
    affects: 'how long a measure is booked for',
  },
  'booking.installMinutesPerUnit': {
    label: 'To set a unit, minutes',
    affects: 'how long an install is booked for',
  },
  'booking.driveKmPerHour': { label: 'Drives go at, km/h', affects: 'drive times without roads' },
  'booking.leadWorkdays': { label: 'Release to ready', affects: 'when an install may be booked' },
  'booking.weightDriveMinute': {
    label: 'A minute driven counts',
    affects: 'order of times offered',
  },
  'booking.weightDayWaited': { label: 'A day waited counts', affects: 'order of times offered' },
  'booking.weightScrapMinute': { label: 'A minute lost counts', affects: 'order of times offered' },
  'booking.weightMissedWish': { label: 'A missed wish counts', affects: 'order of times offered' },
  'booking.quietFrom': { label: 'No texts from', affects: 'when texts go out' },
  'booking.quietUntil': { label: 'No texts until', affects: 'when texts go out' },
  'keeping.customerYears': {
    label: 'Customers are forgotten after, years',
    affects: 'names, addresses, photos and texts of old jobs',
  },
  checklists: { label: 'Checklists', affects: 'what crews are asked on site' },
};

/**
 * What differs between two states of the shop's rules, each with what it moves. Lengths are written in the
 * unit of the later state; a rule without a name of its own is named by its key. Undefined is "as it was".
 */
export function ruleChanges(before: Settings, after: Partial<Settings>): RuleChange[] {
  const fit = after.fit ?? before.fit;
  const named = namedRules(fit);
  const flat = flattened(before);
  return [...flattened(after)].flatMap(([key, to]) => {
    const from = flat.get(key);
    // A rule that the shop never said and one that says none are the same.
    if (to === undefined || JSON.stringify(to ?? null) === JSON.stringify(from ?? null)) return [];
    const { words, ...rule } = named.get(key) ?? { label: key, affects: '' };
    const said = (value: unknown) => words?.(value) ?? valueWords(key, value);
    return [{ ...rule, from: said(from), to: said(to) }];
  });
}

type NamedRule = {
  label: string;
  affects: string;
  /** Null for what is no value of this rule. */
  words?: (value: unknown) => string | null;
};

/** Every rule that has a name, called as the shop's region calls it. */
function namedRules(fit: FitRules): Map<string, NamedRule> {
  const lengths = lengthRuleGroups(fit.region).flatMap(({ rules }) => rules);
  const crown = tradeWord('crown', fit.region);
  const asFine = (value: unknown) =>
    typeof value === 'number' ? fineLength(value, fit.unit) : null;
  const named: [string, NamedRule][] = [
    ...Object.entries(others),
    ...lengths.map(({ rule, label, affects, isFine }): [string, NamedRule] => [
      `fit.${rule}`,
      {
        label,
        affects,
        words: (value) => (typeof value === 'number' ? shownLength(value, fit, isFine) : null),
      },
    ]),
    ...lengthListRules.map(({ rule, label, affects }): [string, NamedRule] => [
      `fit.${rule}`,
      { label, affects, words: (value) => (isNumbers(value) ? shownLengths(value, fit) : null) },
    ]),
    [
      'fit.sheetNominalMm',
      { label: 'Sheet is called', affects: 'widths that stack sheets', words: asFine },
    ],
    [
      'fit.sheetActualMm',
      { label: 'Sheet really measures', affects: 'widths that stack sheets', words: asFine },
    ],
    ['fit.crownSpringDeg', { label: `Spring of the ${crown}, degrees`, affects: 'its mitres' }],
  ];
  return new Map(named);
}

const isNumbers = (value: unknown): value is number[] =>
  Array.isArray(value) && value.every((one) => typeof one === 'number');

function flattened(settings: Partial<Settings>): Map<string, unknown> {
  const { fit, booking, keeping, ...rest } = settings;
  const inPart = (part: string, values: object | undefined): [string, unknown][] =>
    Object.entries(values ?? {}).map(([key, value]) => [`${part}.${key}`, value]);
  return new Map([
    ...Object.entries(rest),
    ...inPart('fit', fit),
    ...inPart('booking', booking),
    ...inPart('keeping', keeping),
  ]);
}

function valueWords(key: string, value: unknown): string {
  if (value === undefined || value === null || value === '') return 'none';
  if (key === 'booking.workdays' && Array.isArray(value)) {
    const days = ['Mon', 'Tue', 'Wed', 'Thu', 'Fri', 'Sat', 'Sun'];
    return value.map((day) => days[Number(day) - 1] ?? '').join(' ');
  }
  if (key === 'fit.ownRuleSets' && Array.isArray(value)) {
    return value.map((set) => String(set?.name ?? '')).join(', ') || 'none';
  }
  if (Array.isArray(value)) {
    return value.every((one) => typeof one !== 'object') ? value.join(' ') || 'none' : 'changed';
  }
  return typeof value === 'object' ? 'changed' : String(value);
}
