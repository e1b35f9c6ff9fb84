/** US residential guideline limits, NAHB-derived: each row with the guide it comes from. */
import { exactInches as inches } from './exact-inches';
import type { Rule, RuleSet } from './rule-set';

const REPAIR = 'Ask the builder to put it right, or agree wider fillers and scribes.';
const constant = (limitMm: number) => ({ kind: 'constant', limitMm }) as const;

const rcpg = (edition: string, clause: string, address: string) => ({
  sense: 'most' as const,
  source: 'NAHB Residential Construction Performance Guidelines',
  edition,
  clause,
  address,
  action: REPAIR,
});
const remodeler = {
  sense: 'most' as const,
  source: 'Remodeler performance standards (NAHB-derived)',
  edition: 'as quoted online, no edition given',
  clause: 'cabinets and counter tops',
  address: 'http://faq.constructionplace.com',
  action: 'Set right before sign-off.',
};
const texas = {
  sense: 'most' as const,
  source: 'Texas Residential Construction Commission standards',
  edition: '10 TAC ch. 304, effective 2005-06-01',
  clause: 'walls and ceilings, bow',
  address: 'https://texinfo.library.unt.edu',
  action: REPAIR,
};

const rules: Rule[] = [
  {
    check: 'wall-plumb',
    limit: { kind: 'proportional', limitMm: inches(3 / 8), perMm: inches(32) },
    overMm: null,
    ...rcpg(
      '3rd',
      'framed walls, out of plumb: 3/8 in in 32 in (quoted)',
      'https://forum.nachi.org',
    ),
  },
  {
    check: 'wall-straightness',
    limit: constant(inches(1 / 4)),
    overMm: inches(32),
    ...texas,
  },
  {
    check: 'ceiling-straightness',
    limit: constant(inches(1 / 2)),
    overMm: inches(32),
    ...texas,
  },
  {
    check: 'floor-fall',
    limit: { kind: 'proportional', limitMm: inches(1 / 2), perMm: inches(240) },
    overMm: null,
    ...rcpg(
      '4th',
      '3-3-3 wood floor slope: 1/2 in in 20 ft (quoted)',
      'https://forum.nachi.org/t/flatness-of-a-condo-slab/112450',
    ),
  },
  {
    check: 'floor-straightness',
    limit: constant(inches(3 / 8)),
    overMm: inches(32),
    ...rcpg(
      '4th',
      '2-2-3 slab: 3/8 in in 32 in (quoted)',
      'https://forum.nachi.org/t/flatness-of-a-condo-slab/112450',
    ),
  },
  { check: 'gap-at-wall', limit: constant(inches(1 / 4)), overMm: null, ...remodeler },
  { check: 'cabinet-faces-in-line', limit: constant(inches(1 / 16)), overMm: null, ...remodeler },
  { check: 'cabinet-corners-in-line', limit: constant(inches(1 / 8)), overMm: null, ...remodeler },
  { check: 'cabinet-warp', limit: constant(inches(1 / 4)), overMm: null, ...remodeler },
  {
    check: 'counter-parallel-to-floor',
    limit: { kind: 'proportional', limitMm: inches(1 / 4), perMm: inches(144) },
    overMm: null,
    ...remodeler,
  },
];

export const usResidential: RuleSet = {
  id: 'us-residential',
  name: 'US residential guidelines (NAHB-derived)',
  region: 'US',
  rules,
};
