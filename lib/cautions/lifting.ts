/**
 * How much one person may lift, by the revised NIOSH lifting equation: RWL = LC · HM · VM · DM · AM · FM · CM.
 * Source: DHHS (NIOSH) Publication 94-110, Applications Manual for the Revised NIOSH Lifting Equation
 * (rev. 9/2021). It holds for two-handed lifting, standing; not for one hand, stooped rooms or stairs.
 */

/** The load constant: the most under the best conditions. */
export const LOAD_CONSTANT_KG = 23;

export type Grip = 'good' | 'fair' | 'poor';

export type Lift = {
  /** From the ankles to the hands. */
  reachMm: number;
  /** Of the hands over the floor where the lift begins. */
  heightMm: number;
  /** How far up or down it goes. */
  travelMm: number;
  /** Turned to the side. */
  twistDeg: number;
  grip: Grip;
  /** From the manual's table of frequency and duration; 1 for a lift now and then within an hour. */
  frequency: number;
};

export type Multipliers = Record<
  'reach' | 'height' | 'travel' | 'twist' | 'frequency' | 'grip',
  number
>;

/**
 * The six multipliers of a lift, each 0 to 1.
 * Edge: beyond 63 cm of reach, 175 cm of height or 135° of twist nothing may be lifted so: 0.
 * Units: mm, degrees. Example: held 25 cm out at 75 cm, lifted 25 cm, straight: all 1 but the grip's.
 */
export function liftMultipliers(lift: Lift): Multipliers {
  const reachCm = lift.reachMm / 10;
  const heightCm = lift.heightMm / 10;
  const travelCm = lift.travelMm / 10;
  const isOutOfRange = heightCm > 175 || heightCm < 0;
  return {
    reach: reachCm > 63 ? 0 : 25 / Math.max(25, reachCm),
    height: isOutOfRange ? 0 : 1 - 0.003 * Math.abs(heightCm - 75),
    travel: travelCm <= 25 ? 1 : Math.max(0, 0.82 + 4.5 / travelCm),
    twist: lift.twistDeg > 135 ? 0 : 1 - 0.0032 * lift.twistDeg,
    frequency: lift.frequency,
    grip: gripOf(lift.grip, heightCm),
  };
}

/** The recommended weight limit from its multipliers, in kilograms. Example: all 1 gives 23. */
export function weightLimitKg(multipliers: Multipliers): number {
  return Object.values(multipliers).reduce((product, one) => product * one, LOAD_CONSTANT_KG);
}

/** Below 75 cm a fair grip is less than a good one; above, as good. */
function gripOf(grip: Grip, heightCm: number): number {
  if (grip === 'poor') return 0.9;
  return grip === 'fair' && heightCm < 75 ? 0.95 : 1;
}

/**
 * What one person may lift to hang a box at a height: held at its middle, from the floor to there, the
 * harder end of the lift counting.
 * Units: mm in, kg out, down to half a kilogram. Example: a box 330 deep hung at 1372 has its hands at
 * 41.5 cm of reach: 9.5 kg, so that a wall unit is lifted by two.
 * Source: as above; the hands at the box's middle and 25 cm from the ankles to its back are common practice.
 */
export function oneHangingLimitKg({
  depthMm,
  undersideMm,
}: {
  depthMm: number;
  undersideMm: number;
}) {
  const reachMm = 250 + depthMm / 2;
  const at = (heightMm: number) =>
    weightLimitKg(
      liftMultipliers({
        reachMm,
        heightMm,
        travelMm: undersideMm,
        twistDeg: 0,
        grip: 'fair',
        frequency: 1,
      }),
    );
  return Math.floor(Math.min(at(0), at(Math.min(undersideMm, 1_750))) * 2) / 2;
}
