/** The shape of a rule set: limits as data, each with its published source. */

/** What is checked; the key under which a verdict is filed. */
export type CheckKind =
  /** Greatest gap of a wall under a straightedge, mm. */
  | 'wall-straightness'
  /** Out of plumb over a height, mm. */
  | 'wall-plumb'
  /** Out of square over a depth along the arm, mm. */
  | 'corner-square'
  /** Greatest less least height of a floor over a span, mm. */
  | 'floor-fall'
  | 'floor-straightness'
  | 'ceiling-fall'
  | 'ceiling-straightness'
  /** Cabinets as set: out of plumb or level over a span, mm. */
  | 'cabinet-plumb-level'
  | 'cabinet-faces-in-line'
  | 'cabinet-corners-in-line'
  | 'cabinet-warp'
  | 'counter-parallel-to-floor'
  /** Open gap between cabinet and wall or ceiling, mm. */
  | 'gap-at-wall'
  /** Open field joint, wood to wood, flat or shaped. */
  | 'joint-wood'
  /** Open field joint, wood to non-wood. */
  | 'joint-wood-nonwood'
  /** Sum of the pieces of a wall less the whole, mm. */
  | 'pieces-against-whole'
  /** Walking width, mm: at least. */
  | 'aisle';

/** The limit as a function of span, mm. */
export type Limit =
  /** The same whatever the span. */
  | { kind: 'constant'; limitMm: number }
  /** So much in each such span. */
  | { kind: 'proportional'; limitMm: number; perMm: number; mostMm?: number }
  /** Straight between the points, rounded half up to whole mm; the last holds beyond. */
  | { kind: 'interpolated'; points: readonly { spanMm: number; limitMm: number }[] }
  /** The first row whose span is not exceeded; the last holds beyond. */
  | { kind: 'bands'; rows: readonly { toMm: number; limitMm: number }[] };

export type Rule = {
  check: CheckKind;
  limit: Limit;
  /** Length of the straightedge, or span, over which it is to be read; null: over what was read. */
  overMm: number | null;
  /** most: the value may not be more; least: it may not be less. */
  sense: 'most' | 'least';
  /** A second level past the limit, with what it asks for. */
  serious?: { limitMm: number; action: string };
  source: string;
  edition: string;
  clause: string;
  /** Where the source was read; empty for common practice. */
  address: string;
  /** What the shop does about it. */
  action: string;
};

export type RuleSet = {
  id: string;
  /** "DIN 18202, finished walls": as shown beside a verdict. */
  name: string;
  /** Where it is at home. */
  region: 'US' | 'UK' | 'AU' | 'EU' | 'any';
  rules: readonly Rule[];
};

/** Said where a limit has no published source. */
export const COMMON_PRACTICE = 'common practice, no source';

/**
 * The limit at a span, mm.
 *
 * Edge: below the first point of a table the first holds, beyond the last the last; a proportional limit
 * of a span of nothing is nothing.
 * Example: DIN 18202 table 3 row 6 (3, 5, 10, 20, 25 at 0.1, 1, 4, 10, 15 m) at 2.5 m: 7.5, so 8.
 * Source: DIN 18202, note to table 3: interpolate, round to whole millimetres.
 */
export function limitAt(limit: Limit, spanMm: number): number {
  switch (limit.kind) {
    case 'constant':
      return limit.limitMm;
    case 'proportional':
      return Math.min((limit.limitMm * spanMm) / limit.perMm, limit.mostMm ?? Infinity);
    case 'bands':
      return (
        (limit.rows.find((row) => spanMm <= row.toMm + 1e-6) ?? limit.rows[limit.rows.length - 1])
          ?.limitMm ?? 0
      );
    case 'interpolated':
      return interpolate(limit.points, spanMm);
  }
}

function interpolate(points: readonly { spanMm: number; limitMm: number }[], spanMm: number) {
  const after = points.findIndex((point) => spanMm <= point.spanMm);
  const to = after < 0 ? points[points.length - 1] : points[after];
  const from = after > 0 ? points[after - 1] : to;
  if (!from || !to) return 0;
  if (from === to) return to.limitMm;
  const share = (spanMm - from.spanMm) / (to.spanMm - from.spanMm);
  const exact = from.limitMm + share * (to.limitMm - from.limitMm);
  return Math.floor(exact + 0.5 + 1e-9);
}
