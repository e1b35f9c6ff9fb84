import type { Run, Unit } from '@/lib/contracts/runs';
import { shortOfStuds } from '@/lib/days/short-of-studs';
import type { Fit } from '@/lib/measure/fit';
import { unitWords } from '@/lib/sheet/unit-words';
import { oneHangingLimitKg } from './lifting';

export const cautionKinds = [
  'lift',
  'hang-alone',
  'tall',
  'wall-fixing',
  'studs-short',
  'cables',
  'services',
  'old-house',
  'dust',
  'laser',
  'codes',
] as const;
export type CautionKind = (typeof cautionKinds)[number];

/** A caution that applies here; the words are the screen's, the numbers and their source are these. */
export type SiteCaution = {
  kind: CautionKind;
  /** Numbers that stand in the words. */
  kg?: number;
  lb?: number;
  year?: number;
  names?: string[];
  /** Where the number or the rule was read; empty: common practice. */
  source: string;
};

export type CautionsHere = {
  runs: readonly Run[];
  fit: Fit;
  features: readonly string[];
  isOldHouse: boolean;
  region: 'US' | 'UK' | 'AU' | 'EU';
  /** Boxes are named in English unless said otherwise. */
  nameOf?: (unit: Unit) => string;
};

const serviceFeatures = new Set([
  'outlet',
  'switch',
  'water',
  'waste',
  'gas',
  'vent',
  'panel',
  'pipe',
]);
const NIOSH = 'NIOSH 94-110, revised lifting equation';

/**
 * The trade's cautions for setting these runs, those with a figure first, "local codes come first" last.
 *
 * Units: mm in; kg with the pounds beside. Edge: what the room has none of is not warned of.
 * Example: hung boxes give the studs, and what one person may lift to their height.
 * Source: beside each; the local law and the makers' instructions come before all of it.
 */
export function siteCautions({
  runs,
  fit,
  features,
  isOldHouse,
  region,
  nameOf = unitWords,
}: CautionsHere): SiteCaution[] {
  const hung = runs.filter(({ level }) => level === 'wall');
  const has = (feature: string) => features.includes(feature);
  return [
    { kind: 'lift', kg: 23, lb: 51, source: NIOSH },
    ...hangAlone(hung),
    ...(runs.some(({ level }) => level === 'tall') ? [{ kind: 'tall', source: '' } as const] : []),
    ...(hung.length > 0
      ? [{ kind: 'wall-fixing', source: 'ANSI/AWI 0620-2018, 3.1; maker’s handbook 2009' } as const]
      : []),
    ...studsShort(shortOfStuds(runs, fit, nameOf)),
    { kind: 'cables', source: region === 'UK' ? 'BS 7671, 522.6 (zones 150 mm)' : '' },
    ...(features.some((feature) => serviceFeatures.has(feature))
      ? [{ kind: 'services', names: has('gas') ? ['gas'] : [], source: '' } as const]
      : []),
    ...(isOldHouse
      ? [
          region === 'US'
            ? ({ kind: 'old-house', year: 1978, source: '40 CFR 745.83' } as const)
            : ({ kind: 'old-house', year: 2000, source: 'HSE, asbestos' } as const),
        ]
      : []),
    { kind: 'dust', source: '' },
    { kind: 'laser', source: '' },
    { kind: 'codes', source: '' },
  ];
}

/** The least of what one person may hang here. */
function hangAlone(hung: readonly Run[]): SiteCaution[] {
  if (hung.length === 0) return [];
  const kg = Math.min(
    ...hung.map((run) => oneHangingLimitKg({ depthMm: run.carcassDepthMm, undersideMm: run.z0Mm })),
  );
  return [{ kind: 'hang-alone', kg, lb: Math.floor(kg * 2.2046), source: NIOSH }];
}

/** Hung boxes that catch fewer studs than the shop's rule asks for: they want backing. */
function studsShort(names: string[]): SiteCaution[] {
  return names.length > 0 ? [{ kind: 'studs-short', names, source: '' }] : [];
}
