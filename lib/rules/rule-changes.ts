import type { FitRules, ShopRules } from '@/lib/contracts/shop-rules';
import { formatLength } from '@/lib/units/format-length';
import { lengthRuleGroups } from './length-rules';

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
  'fit.sheetNominalMm': { label: 'Sheet is called, mm', affects: 'widths that stack sheets' },
  'fit.sheetActualMm': { label: 'Sheet really measures, mm', affects: 'widths that stack sheets' },
  'fit.crownSpringDeg': { label: 'Spring of the crown, degrees', affects: 'its mitres' },
  'fit.ownRuleSets': { label: 'The shop’s own rule sets', affects: 'verdicts' },
  'booking.dayStart': { label: 'Day starts', affects: 'times that are offered' },
  'booking.dayEnd': { label: 'Day ends', affects: 'times that are offered, length of installs' },
  'booking.workdays': { label: 'Days worked', affects: 'times that are offered' },
  'booking.closedDays': { label: 'Closed days', affects: 'times that are offered' },
  'booking.windowMinutes': { label: 'Arrival window', affects: 'what customers are promised' },
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
  const lengths = new Map(
    lengthRuleGroups
      .flatMap(({ rules }) => rules)
      .map(({ rule, label, affects }) => [`fit.${rule}`, { label, affects }]),
  );
  const flat = flattened(before);
  return [...flattened(after)].flatMap(([key, to]) => {
    const from = flat.get(key);
    if (to === undefined || JSON.stringify(to) === JSON.stringify(from)) return [];
    const length = lengths.get(key);
    const words = (value: unknown) => (length ? lengthWords(value, fit) : valueWords(key, value));
    const named = length ?? others[key] ?? { label: key, affects: '' };
    return [{ ...named, from: words(from), to: words(to) }];
  });
}

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

function lengthWords(value: unknown, { unit, stepMm }: FitRules): string {
  return typeof value === 'number' ? formatLength(value, { unit, stepMm }) : 'none';
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
