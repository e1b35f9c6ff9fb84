import type { FitRules } from '@/lib/contracts/shop-rules';

type LengthRule = {
  [K in keyof FitRules]-?: FitRules[K] extends number ? K : never;
}[keyof FitRules];

export type RuleGroup = {
  title: string;
  rules: { rule: LengthRule; label: string; affects: string }[];
};

/** The shop's own lengths by subject: what each one moves. The start values are common practice, with no published source. */
export const lengthRuleGroups: RuleGroup[] = [
  {
    title: 'Fillers',
    rules: [
      {
        rule: 'fillerLeastMm',
        label: 'Least filler at a wall',
        affects: 'when a run is tight or short',
      },
      {
        rule: 'fillerAimMm',
        label: 'Filler aimed at',
        affects: 'suggested widths',
      },
      {
        rule: 'fillerMostMm',
        label: 'Greatest filler',
        affects: 'when a run is loose',
      },
      {
        rule: 'cornerFillerDoorsMm',
        label: 'Inside corner, doors',
        affects: 'runs that meet',
      },
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
      {
        rule: 'scribeLeastTallMm',
        label: 'Least scribe, tall units',
        affects: 'blanks',
      },
      { rule: 'scribeMarginMm', label: 'Working margin', affects: 'blanks' },
      {
        rule: 'usualBowMm',
        label: 'Bow of a wall not read',
        affects: 'how sure a corner is',
      },
    ],
  },
  {
    title: 'Heights',
    rules: [
      {
        rule: 'baseTopMm',
        label: 'Base top over the high point',
        affects: 'datum, kick heights',
      },
      { rule: 'counterTopMm', label: 'Counter', affects: 'sills, appliances' },
      { rule: 'kickHeightMm', label: 'Kick height', affects: 'kick base, legs' },
      {
        rule: 'counterToWallUnitMm',
        label: 'Counter to wall unit',
        affects: 'wall units',
      },
      { rule: 'legMinMm', label: 'Shortest leg', affects: 'kick base' },
      { rule: 'legMaxMm', label: 'Longest leg', affects: 'kick base' },
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
      {
        rule: 'plumbSeriousMm',
        label: 'Plumb or bow: serious',
        affects: 'verdicts',
      },
      {
        rule: 'cornerFlagMm',
        label: 'Corner over the base depth: flag',
        affects: 'verdicts',
      },
      {
        rule: 'repeatAgreementMm',
        label: 'Two readings agree within',
        affects: 'before you leave',
      },
    ],
  },
];
