/** ANSI/AWI 0620, finish carpentry and installation: one set for each grade. */
import { exactInches as inches } from './exact-inches';
import type { Rule, RuleSet } from './rule-set';

type Grade = 'Premium' | 'Custom' | 'Economy';

/** Field joint gaps, mm. Source: ANSI/AWI 0620-2024 cl. 3.4.1.1 (2018 cl. 3.4: the same figures). */
export const AWI_0620_GAPS_MM: Record<Grade, { wood: number; woodNonwood: number }> = {
  Premium: { wood: 0.4, woodNonwood: 0.8 },
  Custom: { wood: 0.8, woodNonwood: 1.6 },
  Economy: { wood: 1.2, woodNonwood: 2.4 },
};

const constant = (limitMm: number) => ({ kind: 'constant', limitMm }) as const;

const joint = (check: Rule['check'], limitMm: number): Rule => ({
  check,
  limit: constant(limitMm),
  overMm: null,
  sense: 'most',
  source: 'ANSI/AWI 0620',
  edition: '2024',
  clause: '3.4.1.1; over no more than 30 % of a joint',
  address: 'https://awizzy.net/index-278.html',
  action: 'Refit the joint.',
});

/** Building faults past these relieve the installer of the gaps they cause. */
const building = (check: Rule['check'], limitMm: number): Rule => ({
  check,
  limit: { kind: 'proportional', limitMm, perMm: inches(144) },
  overMm: null,
  sense: 'most',
  source: 'Architectural Woodwork Standards (AWI/AWMAC/WI)',
  edition: '1st, 2009',
  clause: 'installation: walls and ceilings 1/4 in in 144 in, floors 1/2 in',
  address: 'https://issuhub.com/view/index?id=4686&pageIndex=333',
  action: 'Tell the builder in writing: gaps from this are not the installer’s.',
});

function gradeSet(grade: Grade): RuleSet {
  const gaps = AWI_0620_GAPS_MM[grade];
  return {
    id: `awi-0620-${grade.toLowerCase()}`,
    name: `AWI 0620 ${grade}`,
    region: 'US',
    rules: [
      {
        check: 'cabinet-plumb-level',
        limit: { kind: 'proportional', limitMm: 3.2, perMm: 2_438 },
        overMm: null,
        sense: 'most',
        source: 'ANSI/AWI 0620',
        edition: '2018',
        clause: '3.1: 3.2 mm in 2438 mm (1/8 in in 96 in)',
        address:
          'https://awinet.org/standards/finish-carpentry-installation/requirements/3-1-general-4/',
        action: 'Set level and plumb again.',
      },
      joint('joint-wood', gaps.wood),
      joint('joint-wood-nonwood', gaps.woodNonwood),
      building('wall-straightness', inches(1 / 4)),
      building('wall-plumb', inches(1 / 4)),
      building('corner-square', inches(1 / 4)),
      building('ceiling-fall', inches(1 / 4)),
      building('floor-fall', inches(1 / 2)),
    ],
  };
}

export const awi0620Premium = gradeSet('Premium');
export const awi0620Custom = gradeSet('Custom');
export const awi0620Economy = gradeSet('Economy');
