import type { FitRules } from '@/lib/contracts/shop-rules';
import { fineLength } from '@/lib/sheet/reading-words';
import { formatLength } from '@/lib/units/format-length';
import { type Region, tradeName, tradeWord } from '@/lib/words/trade';

type RuleOf<Value> = {
  [K in keyof FitRules]-?: FitRules[K] extends Value ? K : never;
}[keyof FitRules];

export type LengthRule = {
  rule: RuleOf<number>;
  label: string;
  /** What a change of it moves. */
  affects: string;
  /** Shown and typed to 1/64 in or 0.1 mm, not to the step of the saw. */
  isFine?: boolean;
};
export type RuleGroup = { title: string; rules: LengthRule[] };

export type LengthListRule = { rule: RuleOf<number[]>; label: string; affects: string };

/** The shop's own lengths by subject, called as its region calls them: what each one moves. */
export function lengthRuleGroups(region: Region): RuleGroup[] {
  const filler = tradeWord('filler', region);
  const tall = tradeWord('tallUnit', region);
  const kickBase = tradeWord('kickBase', region);
  return [
    {
      title: `${tradeName('filler', region)}s`,
      rules: [
        {
          rule: 'fillerLeastMm',
          label: `Least ${filler} at a wall`,
          affects: 'when a run is tight or short',
        },
        { rule: 'fillerMostMm', label: `Greatest ${filler}`, affects: 'when a run is loose' },
        { rule: 'cornerFillerDoorsMm', label: 'Inside corner, doors', affects: 'runs that meet' },
        {
          rule: 'cornerFillerDrawersMm',
          label: 'Inside corner, drawers',
          affects: 'runs that meet',
        },
        {
          rule: 'gableClearanceMm',
          label: 'Gable clear of the end wall',
          affects: 'room for the run',
        },
      ],
    },
    {
      title: 'Scribes',
      rules: [
        { rule: 'scribeLeastMm', label: 'Least scribe', affects: 'blanks' },
        { rule: 'scribeLeastTallMm', label: `Least scribe, ${tall}s`, affects: 'blanks' },
        {
          rule: 'scribeLeastFridgePanelMm',
          label: `Least scribe, ${tradeWord('refrigerator', region)} panels`,
          affects: 'blanks',
        },
        {
          rule: 'ceilingScribeLeastMm',
          label: 'Least scribe at the ceiling',
          affects: 'what closes the gap over the boxes',
        },
        { rule: 'scribeMarginMm', label: 'Working margin', affects: 'blanks' },
        { rule: 'usualBowMm', label: 'Bow of a wall not read', affects: 'how sure a corner is' },
      ],
    },
    {
      title: 'Heights',
      rules: [
        {
          rule: 'baseTopMm',
          label: 'Base top over the high point',
          affects: `datum, ${tradeWord('kick', region)} heights`,
        },
        {
          rule: 'counterTopMm',
          label: `${tradeName('counter', region)} height`,
          affects: 'sills, appliances',
        },
        {
          rule: 'kickHeightMm',
          label: `${tradeName('kick', region)} height`,
          affects: `${kickBase}, legs`,
        },
        { rule: 'kickDepthMm', label: `${tradeName('kick', region)} set back`, affects: kickBase },
        {
          rule: 'counterToWallUnitMm',
          label: `${tradeName('counter', region)} to ${tradeWord('wallUnit', region)}`,
          affects: `${tradeWord('wallUnit', region)}s`,
        },
        { rule: 'legMinMm', label: 'Shortest leg', affects: kickBase },
        { rule: 'legMaxMm', label: 'Longest leg', affects: kickBase },
      ],
    },
    {
      title: 'When it is said',
      rules: [
        { rule: 'floorFallFlagMm', label: 'Floor falls: flag', affects: 'verdicts' },
        {
          rule: 'floorFallDecisionMm',
          label: 'Floor falls: needs a decision',
          affects: 'verdicts',
        },
        { rule: 'plumbFlagMm', label: 'Plumb or bow: flag', affects: 'verdicts' },
        { rule: 'plumbSeriousMm', label: 'Plumb or bow: serious', affects: 'verdicts' },
        { rule: 'cornerFlagMm', label: 'Corner out of square: flag', affects: 'verdicts' },
        {
          rule: 'cornerFlagOverMm',
          label: 'Over a depth of',
          affects: 'what a corner is judged over',
        },
        {
          rule: 'repeatAgreementMm',
          label: 'Two readings agree within',
          affects: 'what disagrees before the measurer leaves',
        },
        {
          rule: 'piecesAskMm',
          label: 'Pieces against the whole: ask',
          affects: 'what is asked before the measurer leaves',
        },
        {
          rule: 'piecesRefuseMm',
          label: 'Pieces against the whole: refuse',
          affects: 'what is released',
        },
      ],
    },
    {
      title: 'Building and setting',
      rules: [
        {
          rule: 'unitBuildToleranceMm',
          label: 'One box off its width, as built',
          affects: 'how sure a fill is',
          isFine: true,
        },
        {
          rule: 'jointGrowthMm',
          label: 'Growth at each joint',
          affects: 'how long a run comes out',
          isFine: true,
        },
        {
          rule: 'wallGapAimMm',
          label: 'Gap at a wall, before it is closed',
          affects: 'what a fitter aims at',
        },
        { rule: 'wallGapRejectMm', label: 'Gap at a wall, too much', affects: 'verdicts' },
        {
          rule: 'screwEdgeMm',
          label: 'Screw from the end of a rail, least',
          affects: 'which studs count',
        },
        {
          rule: 'tiltMarginMm',
          label: 'Air over a tall unit stood up',
          affects: 'whether it can be stood up',
        },
        { rule: 'aisleLeastMm', label: 'Aisle, least', affects: 'verdicts' },
      ],
    },
  ];
}

/** Lengths of which there are several, typed with commas between. */
export const lengthListRules: LengthListRule[] = [
  {
    rule: 'readingHeightsMm',
    label: 'Heights at which a wall is read',
    affects: 'what the phone asks for',
  },
  { rule: 'studSpacingsMm', label: 'Usual spacing of studs', affects: 'where the next stud is' },
];

/** A length of the shop's as its form shows it; a text that is left so keeps the exact value. */
export function shownLength(mm: number, fit: FitRules, isFine = false): string {
  return isFine ? fineLength(mm, fit.unit) : formatLength(mm, fit);
}

/** Example: [101.6, 914.4] of an inch shop is `4", 36"`. */
export function shownLengths(list: readonly number[], fit: FitRules): string {
  return list.map((mm) => shownLength(mm, fit)).join(', ');
}
