/** BS 8204, screeds and bases: surface regularity under a 2 m straightedge, by class. */
import type { RuleSet } from './rule-set';

/** Source: Concrete Society, fingertips page on surface regularity. (The 1987 edition used 3 m.) */
export const BS_8204_CLASSES_MM = { SR1: 3, SR2: 5, SR3: 10 } as const;

function classSet(name: keyof typeof BS_8204_CLASSES_MM): RuleSet {
  return {
    id: `bs-8204-${name.toLowerCase()}`,
    name: `BS 8204 ${name}`,
    region: 'UK',
    rules: [
      {
        check: 'floor-straightness',
        limit: { kind: 'constant', limitMm: BS_8204_CLASSES_MM[name] },
        overMm: 2_000,
        sense: 'most',
        source: 'BS 8204',
        edition: 'as quoted by the Concrete Society',
        clause: `surface regularity ${name}`,
        address: 'https://www.concrete.org.uk/fingertips-nuggets.asp?cmd=display&id=1006',
        action: 'Level the floor, or allow for it in the kick.',
      },
    ],
  };
}

export const bs8204Sr1 = classSet('SR1');
export const bs8204Sr2 = classSet('SR2');
export const bs8204Sr3 = classSet('SR3');
