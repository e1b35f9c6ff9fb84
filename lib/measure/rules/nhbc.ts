/** NHBC Standards, chapter 9.1, clause 9.1.3 walls and ceilings. The editions differ: each is its own set. */
import type { Rule, RuleSet } from './rule-set';

type Part = Pick<Rule, 'check' | 'limit' | 'overMm'>;

function edition(year: '2019' | '2020', parts: Part[]): RuleSet {
  return {
    id: `nhbc-${year}`,
    name: `NHBC Standards ${year}`,
    region: 'UK',
    rules: parts.map((part) => ({
      ...part,
      sense: 'most',
      source: 'NHBC Standards',
      edition: year,
      clause: '9.1.3',
      address: `https://nhbc-standards.co.uk/${year}/`,
      action: 'Ask the builder to put it right, or agree wider fillers and scribes.',
    })),
  };
}

const constant = (limitMm: number) => ({ kind: 'constant', limitMm }) as const;

/** 5 mm under a 2 m straightedge; plumb 8 mm to 2.5 m of height, 12 mm above. */
export const nhbc2019 = edition('2019', [
  { check: 'wall-straightness', limit: constant(5), overMm: 2_000 },
  {
    check: 'wall-plumb',
    limit: {
      kind: 'bands',
      rows: [
        { toMm: 2_500, limitMm: 8 },
        { toMm: Number.MAX_SAFE_INTEGER, limitMm: 12 },
      ],
    },
    overMm: null,
  },
]);

/** 3 mm under a 2 m straightedge; plumb 8 mm to 3 m, 12 mm in all; ceilings 3 mm/m to 6 m, 20 mm above. */
export const nhbc2020 = edition('2020', [
  { check: 'wall-straightness', limit: constant(3), overMm: 2_000 },
  {
    check: 'wall-plumb',
    limit: {
      kind: 'bands',
      rows: [
        { toMm: 3_000, limitMm: 8 },
        { toMm: Number.MAX_SAFE_INTEGER, limitMm: 12 },
      ],
    },
    overMm: null,
  },
  {
    check: 'ceiling-fall',
    limit: { kind: 'proportional', limitMm: 3, perMm: 1_000, mostMm: 20 },
    overMm: null,
  },
  { check: 'ceiling-straightness', limit: constant(5), overMm: 2_000 },
]);
