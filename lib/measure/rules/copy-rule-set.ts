import type { OwnRuleSet } from '@/lib/contracts/rule-sets';
import type { LengthUnit } from '@/lib/units/brands';
import { formatLength } from '@/lib/units/format-length';
import type { Limit, RuleSet } from './rule-set';

/**
 * A shop's own copy of a rule set, to be edited. Each limit keeps its source until it is changed.
 * Example: NHBC Standards 2020 becomes "NHBC Standards 2020, ours" with the same limits.
 */
export function copyRuleSet(set: RuleSet, id: string): OwnRuleSet {
  return {
    id,
    name: `${set.name}, ours`,
    region: set.region,
    rules: set.rules.map((rule) => ({ ...rule, limit: copyLimit(rule.limit) })),
  };
}

/**
 * The copy with another limit at one place. What the shop changed is no longer the publisher's word, so its
 * source then says that it is the shop's, changed from what was published.
 *
 * @param row which point or row of a table; ignored where the limit is one figure
 */
export function withLimit(set: OwnRuleSet, at: number, limitMm: number, row = 0): OwnRuleSet {
  return {
    ...set,
    rules: set.rules.map((rule, place) => {
      if (place !== at) return rule;
      const limit = limitWith(rule.limit, limitMm, row);
      if (JSON.stringify(limit) === JSON.stringify(rule.limit)) return rule;
      const isChanged = rule.edition.startsWith('changed by the shop');
      const from = [rule.edition, rule.clause].filter(Boolean).join(', ');
      return {
        ...rule,
        limit,
        address: '',
        edition: isChanged ? rule.edition : `changed by the shop${from ? ` from ${from}` : ''}`,
      };
    }),
  };
}

/**
 * The figures of a limit that can be edited, with what each is for, in the shop's unit.
 * Example: 6 mm over 600, in inches: "in each 23 5/8\"".
 */
export function limitRows(limit: Limit, unit: LengthUnit): { limitMm: number; words: string }[] {
  const span = (mm: number) => spanWords(mm, unit);
  switch (limit.kind) {
    case 'constant':
      return [{ limitMm: limit.limitMm, words: '' }];
    case 'proportional':
      return [{ limitMm: limit.limitMm, words: `in each ${span(limit.perMm)}` }];
    case 'interpolated':
      return limit.points.map((point) => ({
        limitMm: point.limitMm,
        words: `at ${span(point.spanMm)}`,
      }));
    case 'bands':
      return limit.rows.map((row, place) => ({
        limitMm: row.limitMm,
        words: row.toMm > 1e6 ? 'beyond' : `${place === 0 ? 'up' : 'then'} to ${span(row.toMm)}`,
      }));
  }
}

/** Metres are how published metric limits are written: 3 m, and 600 mm below one. */
export function spanWords(mm: number, unit: LengthUnit): string {
  if (unit === 'in') return formatLength(mm, { unit, stepMm: 25.4 / 8 });
  return mm >= 1_000 ? `${mm / 1_000} m` : `${mm} mm`;
}

function limitWith(limit: OwnRuleSet['rules'][number]['limit'], limitMm: number, row: number) {
  switch (limit.kind) {
    case 'constant':
    case 'proportional':
      return { ...limit, limitMm };
    case 'interpolated':
      return {
        ...limit,
        points: limit.points.map((point, at) => (at === row ? { ...point, limitMm } : point)),
      };
    case 'bands':
      return {
        ...limit,
        rows: limit.rows.map((band, at) => (at === row ? { ...band, limitMm } : band)),
      };
  }
}

function copyLimit(limit: Limit): OwnRuleSet['rules'][number]['limit'] {
  switch (limit.kind) {
    case 'interpolated':
      return { ...limit, points: limit.points.map((point) => ({ ...point })) };
    case 'bands':
      return { ...limit, rows: limit.rows.map((row) => ({ ...row })) };
    default:
      return { ...limit };
  }
}
