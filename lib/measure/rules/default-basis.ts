/**
 * Where each default rule comes from, field by field, for the Shop rules screen.
 * `sources` are keys of `PRACTICE_SOURCES` (M measuring, F dimensions and fillers, S setting, T times); an
 * empty list is our own judgement, or a law named in the note.
 */
import type { BookingRules, FitRules } from '@/lib/contracts/shop-rules';

export type RuleBasis = {
  sources: string[];
  strength: 'strong' | 'medium' | 'weak' | 'common-practice';
  /** Words for the screen. */
  note: string;
};

const basis = (sources: string, strength: RuleBasis['strength'], note: string): RuleBasis => ({
  sources: sources === '' ? [] : sources.split(' '),
  strength,
  note,
});
const practice = (note: string): RuleBasis =>
  basis('', 'common-practice', `${note} Common practice, no source.`);

/** Basis of every measuring rule; a rule without published source says so in its note. */
export const fitRuleBasis: Record<keyof FitRules, RuleBasis> = {
  unit: practice('The unit the shop reads and cuts in.'),
  stepMm: practice('Step of the saw fence and of the tape.'),
  region: practice('Decides the words and the starting figures.'),
  readingHeightsMm: basis(
    'M01 M02 M03 M04',
    'medium',
    'Floor, counter and wall-unit heights from measuring guides; the last stands for just under the ceiling.',
  ),
  fillerLeastMm: basis('F01 F05', 'strong', 'A maker asks for at least 1 in at a wall.'),
  fillerMostMm: basis('F05', 'medium', 'Stock fillers are 3 and 6 in wide.'),
  cornerFillerDoorsMm: basis('F01 F02 F06', 'strong', '2 in each side, never under 1 1/2.'),
  cornerFillerDrawersMm: basis('F02 F04', 'medium', '3 in, or front + handle + 1 1/4 if more.'),
  gableClearanceMm: practice('Room to set a gable beside a wall without forcing it.'),
  jointGrowthMm: basis(
    'M14 M15',
    'common-practice',
    'Boxes set one by one grow; 1/16 in at each of six boxes is on record. The default is our judgement.',
  ),
  unitBuildToleranceMm: basis('M15', 'common-practice', 'Our judgement of one box as built.'),
  fillerPlane: practice(
    'Framed boxes: flush with the frame; frameless boxes: flush with the doors.',
  ),
  scribeMarginMm: basis('F11 F13', 'common-practice', 'The worst of the wall + 1/8 in.'),
  scribeLeastMm: basis('F11', 'medium', '1/2 in is usual at the back of finished ends.'),
  scribeStepMm: practice('Scribe stock is rounded up to this.'),
  usualBowMm: practice('Bow assumed of a wall whose face was not read.'),
  repeatAgreementMm: basis('M17 M18', 'strong', 'Tape tolerance: 1/16 in up to 30 ft.'),
  baseTopMm: basis('F25 F28 F31', 'strong', '34 1/2 in; 870 UK; 868 AU, over the high point.'),
  counterTopMm: basis('F25 F28 F31', 'strong', '36 in; 910 UK; 900 AU.'),
  kickHeightMm: basis('F27 F28 F31', 'medium', '4 in; 150 mm on legs in the UK.'),
  kickDepthMm: basis('F27', 'medium', '3 in US; the metric figure is our judgement.'),
  counterToWallUnitMm: basis('F26 F28 F30', 'strong', '18 in; 490 mm (450 to 500).'),
  legMinMm: basis('F42', 'weak', 'Legs go 10 to 20 mm down; from memory: see the leg maker.'),
  legMaxMm: basis('F42', 'weak', 'Legs go 20 to 30 mm up; from memory: see the leg maker.'),
  floorFallFlagMm: basis('M31 M36', 'medium', '1/2 in over the run.'),
  floorFallDecisionMm: basis('M35', 'medium', 'Over 3/4 in needs a decision and the customer.'),
  studSpacingsMm: practice('16 and 24 in; 400 and 600; 450 and 600 in Australia; 625 in Europe.'),
  ceilingScribeLeastMm: basis('F35 F36', 'medium', 'A 3/4 in strip left to scribe.'),
  tiltMarginMm: practice('Air over the corner of a tall unit while it is stood up.'),
  aisleLeastMm: basis('F45', 'strong', '42 in for one cook; 1000 and 1200 mm elsewhere.'),
  plumbFlagMm: basis('M31', 'strong', 'Beyond 1/4 in in 144 in the gaps are not the fitter’s.'),
  plumbSeriousMm: basis('M33 M34', 'strong', '1/2 in in 8 ft, 19 mm in 2400 mm by warranties.'),
  cornerFlagMm: basis('M31', 'common-practice', '1/4 in, scaled to a base’s depth by judgement.'),
  cornerFlagOverMm: practice('The depth of a base.'),
  piecesAskMm: basis('M05', 'common-practice', 'Add the pieces; the figure is our judgement.'),
  piecesRefuseMm: basis('M05', 'common-practice', 'Add the pieces; the figure is our judgement.'),
  wallGapAimMm: basis('F38', 'strong', 'Gap at a wall before caulk.'),
  wallGapRejectMm: basis('F38', 'strong', 'Gaps over 1/4 in are not accepted.'),
  scribeLeastTallMm: basis('F11', 'common-practice', 'Tall units need more; 3/4 in is judgement.'),
  scribeLeastFridgePanelMm: basis('F11', 'medium', 'Refrigerator panels come about 1 in over.'),
  studsNeeded: basis(
    'S06',
    'strong',
    'To 18 in one, 21 to 39 two, 42 to 48 three; top and bottom.',
  ),
  screwEdgeMm: practice('Keeps a screw out of the end grain of the rail.'),
  sheetNominalMm: practice('3/4 in and 18 mm are what boxes are mostly made of.'),
  sheetActualMm: practice('Nominal is not actual: read a sheet of each delivery.'),
  crownSpringDeg: practice('38° against the wall (52° against the ceiling) is the usual crown.'),
  ruleSet: practice('The limits above, until the shop picks a published set.'),
  ownRuleSets: practice('Sets that the shop wrote itself.'),
};

/** Basis of every booking rule. */
export const bookingRuleBasis: Record<keyof BookingRules, RuleBasis> = {
  dayStart: practice('A working day of eight hours.'),
  dayEnd: practice('A working day of eight hours.'),
  workdays: practice('Monday to Friday.'),
  closedDays: practice('The shop’s own.'),
  holidays: practice('The shop’s own: which public holidays it keeps.'),
  windowMinutes: basis('T14 T18', 'medium', 'Two hours; four is the outer bound.'),
  leadWorkdays: basis('T15 T16', 'medium', 'Approved to ready: 6 to 12 weeks, 8 to begin with.'),
  measureMinutesPerRoom: basis('M30', 'weak', '90 minutes for a kitchen.'),
  installMinutesPerUnit: basis('T01 T03', 'medium', 'One box, one hour.'),
  quietFrom: basis('', 'strong', '47 CFR 64.1200(c)(1): no messages after 21:00 local time.'),
  quietUntil: basis('', 'strong', '47 CFR 64.1200(c)(1): no messages before 08:00 local time.'),
  weightDriveMinute: practice('A minute driven is a minute of trouble.'),
  weightDayWaited: practice('A day that the customer waits counts as three minutes of driving.'),
  weightScrapMinute: practice('Four minutes that no other visit can use count as one of driving.'),
  weightMissedWish: practice('A wish that is missed counts as an hour of driving.'),
  driveKmPerHour: practice('Towns, lanes and main roads of a working day together.'),
};
