/** What a new shop starts with. The basis of every figure is in `default-basis.ts`. */
import type { BookingRules, FitRules, ShopRules } from '@/lib/contracts/shop-rules';
import { usualOpeningWeights } from '@/lib/schedule/planning-rules';
import { exactInches as inches } from './exact-inches';

export type Region = FitRules['region'];

/**
 * Returns the rules a new shop in the region starts with; each can be changed and each has a basis.
 *
 * Edge: every call gives a fresh value, so a shop that edits its copy edits no other shop's.
 * Example: `defaultShopRules('US').fit.fillerLeastMm` is 25.4 (1 in); `('UK').fit.baseTopMm` is 870.
 * Problems: none. Source: `fitRuleBasis` and `bookingRuleBasis` in `default-basis.ts`, field by field.
 */
export function defaultShopRules(region: Region): ShopRules {
  return { fit: fitRulesFor(region), booking: bookingRules() };
}

function fitRulesFor(region: Region): FitRules {
  switch (region) {
    case 'US':
      return inchRules();
    case 'UK':
      return metricRules('UK');
    case 'AU':
      return {
        ...metricRules('AU'),
        baseTopMm: 868,
        counterTopMm: 900,
        studSpacingsMm: [450, 600],
        aisleLeastMm: 1_000,
      };
    case 'EU':
      return { ...metricRules('EU'), studSpacingsMm: [400, 600, 625], aisleLeastMm: 1_200 };
  }
}

function inchRules(): FitRules {
  return {
    unit: 'in',
    stepMm: inches(1 / 16),
    region: 'US',
    readingHeightsMm: [inches(4), inches(36), inches(57), inches(90)],
    fillerLeastMm: inches(1),
    fillerMostMm: inches(3),
    cornerFillerDoorsMm: inches(2),
    cornerFillerDrawersMm: inches(3),
    gableClearanceMm: inches(1 / 8),
    jointGrowthMm: inches(1 / 64),
    unitBuildToleranceMm: inches(1 / 32),
    fillerPlane: 'carcass-front',
    scribeMarginMm: inches(1 / 8),
    scribeLeastMm: inches(1 / 2),
    scribeStepMm: inches(1 / 16),
    usualBowMm: inches(1 / 8),
    repeatAgreementMm: inches(1 / 16),
    baseTopMm: inches(34.5),
    counterTopMm: inches(36),
    kickHeightMm: inches(4),
    kickDepthMm: inches(3),
    counterToWallUnitMm: inches(18),
    legMinMm: inches(3.375),
    legMaxMm: inches(5),
    floorFallFlagMm: inches(1 / 2),
    floorFallDecisionMm: inches(3 / 4),
    studSpacingsMm: [inches(16), inches(24)],
    ceilingScribeLeastMm: inches(3 / 4),
    tiltMarginMm: inches(1 / 2),
    aisleLeastMm: inches(42),
    plumbFlagMm: inches(1 / 4),
    plumbSeriousMm: inches(1 / 2),
    cornerFlagMm: inches(1 / 4),
    cornerFlagOverMm: inches(24),
    piecesAskMm: inches(1 / 8),
    piecesRefuseMm: inches(1 / 4),
    wallGapAimMm: inches(1 / 8),
    wallGapRejectMm: inches(1 / 4),
    scribeLeastTallMm: inches(3 / 4),
    scribeLeastFridgePanelMm: inches(1),
    studsNeeded: [
      { toWidthMm: inches(18), studs: 1 },
      { toWidthMm: inches(39), studs: 2 },
      { toWidthMm: inches(48), studs: 3 },
    ],
    screwEdgeMm: inches(3 / 4),
    sheetNominalMm: inches(3 / 4),
    sheetActualMm: null,
    crownSpringDeg: 38,
    ruleSet: 'shop',
  };
}

function metricRules(region: Exclude<Region, 'US'>): FitRules {
  return {
    unit: 'mm',
    stepMm: 1,
    region,
    readingHeightsMm: [100, 910, 1_450, 2_250],
    fillerLeastMm: 25,
    fillerMostMm: 75,
    cornerFillerDoorsMm: 50,
    cornerFillerDrawersMm: 75,
    gableClearanceMm: 3,
    jointGrowthMm: 0.3,
    unitBuildToleranceMm: 0.5,
    fillerPlane: 'door-front',
    scribeMarginMm: 3,
    scribeLeastMm: 13,
    scribeStepMm: 1,
    usualBowMm: 3,
    repeatAgreementMm: 2,
    baseTopMm: 870,
    counterTopMm: 910,
    kickHeightMm: 150,
    kickDepthMm: 50,
    counterToWallUnitMm: 490,
    legMinMm: 135,
    legMaxMm: 175,
    floorFallFlagMm: 13,
    floorFallDecisionMm: 19,
    studSpacingsMm: [400, 406.4, 600, 609.6],
    ceilingScribeLeastMm: 19,
    tiltMarginMm: 12,
    aisleLeastMm: 1_000,
    plumbFlagMm: 6,
    plumbSeriousMm: 13,
    cornerFlagMm: 6,
    cornerFlagOverMm: 600,
    piecesAskMm: 3,
    piecesRefuseMm: 6,
    wallGapAimMm: 3,
    wallGapRejectMm: 6,
    scribeLeastTallMm: 19,
    scribeLeastFridgePanelMm: 25,
    studsNeeded: [
      { toWidthMm: 450, studs: 1 },
      { toWidthMm: 990, studs: 2 },
      { toWidthMm: 1_220, studs: 3 },
    ],
    screwEdgeMm: 19,
    sheetNominalMm: 18,
    sheetActualMm: null,
    crownSpringDeg: 38,
    ruleSet: 'shop',
  };
}

function bookingRules(): BookingRules {
  return {
    dayStart: '08:00',
    dayEnd: '16:00',
    workdays: [1, 2, 3, 4, 5],
    closedDays: [],
    holidays: null,
    windowMinutes: 120,
    leadWorkdays: 40,
    measureMinutesPerRoom: 90,
    installMinutesPerUnit: 60,
    quietFrom: '21:00',
    quietUntil: '08:00',
    driveKmPerHour: 45,
    weightDriveMinute: usualOpeningWeights.driveMinute,
    weightDayWaited: usualOpeningWeights.dayWaited,
    weightScrapMinute: usualOpeningWeights.scrapMinute,
    weightMissedWish: usualOpeningWeights.missedWish,
  };
}
