import type { Tool } from '@/lib/contracts/wall-book';

/** Ends of the length that butt against a surface (a hook, an inside corner). */
export type BoundedEnds = 0 | 1 | 2;

/**
 * Maximum permissible errors of tapes, mm: a + b · L, L in metres rounded up, plus c for each bounded end.
 * Source: Directive 2014/32/EU annex X (MI-008) chapter I, the classes of OIML R 35.
 */
const tapeClasses = {
  I: { a: 0.1, b: 0.1, c: 0.1 },
  II: { a: 0.3, b: 0.2, c: 0.2 },
  III: { a: 0.6, b: 0.4, c: 0.3 },
};

/** An angle taken with a tool that reads no angles is counted as no surer than this, degrees. */
const NO_ANGLE_TOOL_DEG = 1;

/**
 * Standard uncertainty of one reading of a length, mm.
 * Edge rule: a tool that reads no lengths (angle finder) counts as a class III tape read to 1 mm.
 * Example: tape class II, step 1 mm, repeatability 0.3, 3.2 m between two walls:
 * MPE 0.3 + 0.2·4 + 2·0.2 = 1.5; u = √((1.5/√3)² + (1/√12)² + 0.3²) = 0.961 mm.
 * Source: JCGM 100:2008, 4.3.7 (rectangular), 5.1.2; Directive 2014/32/EU MI-008 (tapes).
 */
export function lengthUncertainty(tool: Tool, lengthMm: number, boundedEnds: BoundedEnds): number {
  return Math.hypot(toolCommonPart(tool, lengthMm, boundedEnds), lengthOwnPart(tool));
}

/**
 * The part of a length's u that all readings of one tool share, mm: its own error.
 * Edge rule: as `lengthUncertainty`. A level's is its slope over the length.
 * Example: a laser meter of ±1.5 mm → 1.5/√3 = 0.866 mm; where the maker states 95 %, 0.75 mm.
 * Source: JCGM 100:2008, 4.3.3 (95 %), 4.3.7, F.1.2.3 (common error).
 */
export function toolCommonPart(tool: Tool, lengthMm: number, boundedEnds: BoundedEnds): number {
  const { spec } = tool;
  if (spec.kind === 'laser') return standard(spec.mpeMm, spec.statedAt95);
  if (spec.kind === 'level') return slopeUncertainty(tool) * Math.abs(lengthMm);
  const { a, b, c } = tapeClasses[spec.kind === 'tape' ? spec.accuracyClass : 'III'];
  const metres = Math.max(1, Math.ceil(Math.abs(lengthMm) / 1000));
  return standard(a + b * metres + c * boundedEnds, false);
}

/**
 * The part each reading of a length has for itself, mm: the step it is read to and the shop's repeatability.
 * Example: step 1 mm, repeatability 0.3 → √(1/12 + 0.09) = 0.416 mm.
 * Source: JCGM 100:2008, F.2.2.1 (resolution q/√12).
 */
export function lengthOwnPart(tool: Tool): number {
  const { spec } = tool;
  if (spec.kind === 'angle-finder') return 1 / Math.sqrt(12);
  return Math.hypot(spec.stepMm / Math.sqrt(12), spec.repeatabilityMm);
}

/**
 * Standard uncertainty of one reading of an angle, degrees.
 * Edge rule: a level counts by its slope; a tape or laser, which read no angle, as ±1°.
 * Example: angle finder ±0.1°, step 0.05°, repeatability 0.05° → √(0.0577² + 0.0144² + 0.05²) = 0.078°.
 * Source: JCGM 100:2008, 4.3.7, 5.1.2.
 */
export function angleUncertainty(tool: Tool): number {
  return Math.hypot(angleCommonPart(tool), angleOwnPart(tool));
}

/** The part of an angle's u all readings of one tool share, degrees: n of them in a sum add n-fold. */
export function angleCommonPart(tool: Tool): number {
  const { spec } = tool;
  if (spec.kind === 'angle-finder') return standard(spec.mpeDeg, spec.statedAt95);
  if (spec.kind === 'level') return (Math.atan(slopeUncertainty(tool)) * 180) / Math.PI;
  return standard(NO_ANGLE_TOOL_DEG, false);
}

/** The part each reading of an angle has for itself, degrees: step and repeatability. */
export function angleOwnPart({ spec }: Tool): number {
  if (spec.kind !== 'angle-finder') return 0;
  return Math.hypot(spec.stepDeg / Math.sqrt(12), spec.repeatabilityDeg);
}

/**
 * Standard uncertainty of the level or plumb line itself, mm per mm: times the distance between two
 * places it is what their comparison carries.
 * Edge rule: a tool that is no level counts as ±1 mm/m.
 * Example: a level of ±0.5 mm/m → 0.5/1000/√3 = 0.000289; over 2.4 m, 0.69 mm.
 * Source: JCGM 100:2008, 4.3.7; makers state levels in mm/m.
 */
export function slopeUncertainty({ spec }: Tool): number {
  if (spec.kind !== 'level') return standard(1, false) / 1000;
  return standard(spec.mpeMmPerM, spec.statedAt95) / 1000;
}

function standard(limit: number, statedAt95: boolean | undefined): number {
  return statedAt95 ? limit / 2 : limit / Math.sqrt(3);
}
