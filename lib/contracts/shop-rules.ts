/** Shop rules: what the shop decides. Each default's basis is in `lib/measure/rules`. */
import { z } from 'zod';
import { usualOpeningWeights } from '@/lib/schedule/planning-rules';
import { checklistRules } from './checklists';
import { ownRuleSet } from './rule-sets';

const mmValue = z
  .number()
  .finite()
  .min(0, 'A length cannot be less than nothing.')
  .max(5_000, 'At most 5 m.');

/** Rules of the measuring engine. Lengths in millimetres, angles in degrees. */
export const fitRules = z.object({
  unit: z.enum(['in', 'mm']),
  /** Step to which cut sizes are rounded: 1/16 in = 1.5875, 1/32, 1, 0.5. */
  stepMm: z.number().positive(),
  region: z.enum(['US', 'UK', 'AU', 'EU']),
  /** Heights at which a wall's length is asked for. */
  readingHeightsMm: z
    .array(mmValue)
    .min(1, 'At least one height.')
    .max(6, 'At most six heights: a measurer has to read each.'),
  fillerLeastMm: mmValue,
  fillerMostMm: mmValue,
  /** Least filler at an inside corner between two runs: doors, drawers. */
  cornerFillerDoorsMm: mmValue,
  cornerFillerDrawersMm: mmValue,
  gableClearanceMm: mmValue,
  jointGrowthMm: z.number().min(0).max(5),
  unitBuildToleranceMm: z.number().min(0).max(5),
  /** Plane in which a filler's width counts. */
  fillerPlane: z.enum(['door-front', 'carcass-front']),
  scribeMarginMm: mmValue,
  scribeLeastMm: mmValue,
  scribeStepMm: z.number().positive(),
  /** Assumed greatest bow of a wall not read, mm over its length; widens uncertainty. */
  usualBowMm: mmValue,
  /** Agreement of two readings of one thing. */
  repeatAgreementMm: mmValue,
  baseTopMm: mmValue,
  counterTopMm: mmValue,
  kickHeightMm: mmValue,
  kickDepthMm: mmValue,
  counterToWallUnitMm: mmValue,
  legMinMm: mmValue,
  legMaxMm: mmValue,
  floorFallFlagMm: mmValue,
  floorFallDecisionMm: mmValue,
  studSpacingsMm: z.array(mmValue),
  ceilingScribeLeastMm: mmValue,
  tiltMarginMm: mmValue,
  aisleLeastMm: mmValue,
  /** Wall out of plumb or bowed over the height read: flag, serious. */
  plumbFlagMm: mmValue.default(6),
  plumbSeriousMm: mmValue.default(13),
  /** Corner out of square over `cornerFlagOverMm` of depth. */
  cornerFlagMm: mmValue.default(6),
  cornerFlagOverMm: z.number().positive().max(5_000).default(600),
  /** Pieces of a wall against the whole: ask, refuse to release. */
  piecesAskMm: mmValue.default(3),
  piecesRefuseMm: mmValue.default(6),
  /** Gap left at a wall before it is closed: aim, reject. */
  wallGapAimMm: mmValue.default(3),
  wallGapRejectMm: mmValue.default(6),
  /** Back scribe of tall units and of refrigerator panels; other edges use `scribeLeastMm`. */
  scribeLeastTallMm: mmValue.default(19),
  scribeLeastFridgePanelMm: mmValue.default(25),
  /** Studs behind a hung box by its width, narrowest first; wider than the last needs the last. */
  studsNeeded: z
    .array(z.object({ toWidthMm: z.number().positive(), studs: z.number().int().min(1).max(6) }))
    .min(1)
    .default([
      { toWidthMm: 460, studs: 1 },
      { toWidthMm: 1_000, studs: 2 },
      { toWidthMm: 1_250, studs: 3 },
    ]),
  /** Least distance of a fixing screw from the end of a box's rail. */
  screwEdgeMm: mmValue.default(19),
  /** What sheet goods are called, and what they came to when read; null: not read, sizes stay as drawn. */
  sheetNominalMm: z.number().min(3).max(60).default(18),
  sheetActualMm: z.number().min(2).max(65).nullable().default(null),
  /** Between the back of a crown moulding and the wall. */
  crownSpringDeg: z.number().gt(0).lt(90).default(38),
  /** Which published rule set gives the verdicts; `shop` for the shop's own. */
  ruleSet: z.string().max(60),
  /** Copies of rule sets that the shop has made its own. */
  ownRuleSets: z.array(ownRuleSet).max(12).optional(),
});
export type FitRules = z.infer<typeof fitRules>;

const weight = z
  .number('A number, 0 for no matter.')
  .min(0, '0 or more.')
  .max(1_000, 'At most 1000.');
const minutes = (least: number) =>
  z
    .number('Minutes.')
    .int('Whole minutes.')
    .min(least, `At least ${least} minutes.`)
    .max(480, 'At most 480 minutes, eight hours.');

/** Rules of booking and telling. Times are local, in the shop's zone. */
export const bookingRules = z.object({
  dayStart: z.string().regex(/^\d\d:\d\d$/),
  dayEnd: z.string().regex(/^\d\d:\d\d$/),
  /** ISO weekdays worked, 1 Monday … 7 Sunday. */
  workdays: z.array(z.number().int().min(1).max(7)),
  closedDays: z.array(z.iso.date()),
  /** Public holidays that the shop keeps; null: none. */
  holidays: z
    .object({
      /** ISO 3166-1, two letters. */
      country: z.string().regex(/^[A-Z]{2}$/, 'Two capital letters.'),
      /** State, province or land (ISO 3166-2 without the country); empty: the country's own days. */
      part: z.string().max(10).default(''),
      /** Those on which it works all the same. */
      worked: z.array(z.iso.date()).max(200).default([]),
    })
    .nullable()
    .default(null),
  windowMinutes: minutes(15),
  leadWorkdays: z
    .number()
    .int('Whole days.')
    .min(0, 'None is 0.')
    .max(260, 'At most 260, a year of working days.'),
  measureMinutesPerRoom: minutes(10),
  installMinutesPerUnit: minutes(10),
  quietFrom: z.string().regex(/^\d\d:\d\d$/),
  quietUntil: z.string().regex(/^\d\d:\d\d$/),
  /** The speed of drives that no road service answered for. */
  driveKmPerHour: z
    .number('A speed.')
    .min(5, 'At least 5 km/h (3 mph).')
    .max(130, 'At most 130 km/h (80 mph).')
    .default(45),
  /** How times that work are ranked: what counts as how many minutes of trouble (lib/schedule/planning-rules). */
  weightDriveMinute: weight.default(usualOpeningWeights.driveMinute),
  weightDayWaited: weight.default(usualOpeningWeights.dayWaited),
  weightScrapMinute: weight.default(usualOpeningWeights.scrapMinute),
  weightMissedWish: weight.default(usualOpeningWeights.missedWish),
});
export type BookingRules = z.infer<typeof bookingRules>;

/** How long a customer is kept after the last thing that happened; null: until the owner erases them. */
export const keepingRules = z.object({
  customerYears: z.number().int().min(1, 'One year at least.').max(50).nullable(),
});

export const shopRules = z.object({
  fit: fitRules,
  booking: bookingRules,
  /** Left out: the usual lists. */
  checklists: checklistRules.optional(),
  keeping: keepingRules.optional(),
});
export type ShopRules = z.infer<typeof shopRules>;

/** What the shop is called, where it is, and all of its rules. */
export const shopSettings = shopRules.extend({
  name: z.string(),
  phone: z.string(),
  email: z.string(),
  region: z.enum(['US', 'UK', 'AU', 'EU']),
  zone: z.string(),
});
export type ShopSettings = z.infer<typeof shopSettings>;

/** The widest published limits (PS 1 at 1 1/4 in) lie 1.6 mm off the name: further off is another sheet. */
const SHEET_OFF_MM = 2.5;

const orderedFit = fitRules.superRefine((fit, ctx) => {
  const mustNotFall = (lesser: keyof FitRules, greater: keyof FitRules, message: string) => {
    if (Number(fit[lesser]) > Number(fit[greater])) {
      ctx.addIssue({ code: 'custom', path: [greater], message });
    }
  };
  mustNotFall('fillerLeastMm', 'fillerMostMm', 'The greatest is less than the least.');
  mustNotFall('legMinMm', 'legMaxMm', 'The longest leg is shorter than the shortest.');
  mustNotFall('plumbFlagMm', 'plumbSeriousMm', 'Serious comes before the flag.');
  mustNotFall('piecesAskMm', 'piecesRefuseMm', 'Refusing comes before asking.');
  const { sheetActualMm: actual, sheetNominalMm: nominal } = fit;
  if (actual !== null && Math.abs(actual - nominal) > SHEET_OFF_MM) {
    const message = 'That sheet is too far from its name. Read it again, or name another sheet.';
    ctx.addIssue({ code: 'custom', path: ['sheetActualMm'], message });
  }
});

const clock = /^([01]\d|2[0-3]):[0-5]\d$/;

const orderedBooking = bookingRules.superRefine((booking, ctx) => {
  for (const field of ['dayStart', 'dayEnd', 'quietFrom', 'quietUntil'] as const) {
    if (!clock.test(booking[field])) {
      ctx.addIssue({ code: 'custom', path: [field], message: 'Write the time as 07:30.' });
    }
  }
  if (booking.dayStart >= booking.dayEnd) {
    ctx.addIssue({ code: 'custom', path: ['dayEnd'], message: 'The day ends before it starts.' });
  }
  if (booking.workdays.length === 0) {
    ctx.addIssue({ code: 'custom', path: ['workdays'], message: 'Name a day that is worked.' });
  }
});

/** Only what is given is changed; each set of rules is given whole. */
export const changeShopRulesInput = z.object({
  name: z.string().trim().min(1, 'Give the shop a name.').max(80).optional(),
  /** As typed; kept as E.164. */
  phone: z.string().trim().max(40).optional(),
  email: z.union([z.literal(''), z.email('That is no e-mail address.').max(200)]).optional(),
  zone: z.string().min(1).max(60).optional(),
  fit: orderedFit.optional(),
  booking: orderedBooking.optional(),
  /** A kind that is left out goes back to the usual list. */
  checklists: checklistRules.optional(),
  keeping: keepingRules.optional(),
});
export type ChangeShopRulesInput = z.infer<typeof changeShopRulesInput>;
