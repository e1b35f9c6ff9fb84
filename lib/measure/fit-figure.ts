/** A figure of the fit that can be opened on a screen: what it is, how sure, from which readings. */
import type { Figure } from '@/lib/measure/figure';

/** Each kind has its formula in words in `explain.ts`. */
export type FigureKind =
  | 'corner-angle'
  | 'corner-deviation'
  | 'corner-offset'
  | 'corner-twist'
  | 'wall-length-read'
  | 'wall-length-in-pieces'
  | 'pieces-against-whole'
  | 'wall-length'
  | 'wall-straightness'
  | 'wall-straightedge-gap'
  | 'wall-lean'
  | 'wall-plumb'
  | 'wall-flatness'
  | 'floor-fall'
  | 'clear-height'
  | 'clear-opening'
  | 'run-room'
  | 'run-slack'
  | 'set-line-gap'
  | 'back-gap'
  | 'wall-to-cut'
  | 'free-room'
  | 'filler-width'
  | 'filler-taper'
  | 'filler-blank'
  | 'filler-cut'
  | 'edge-out-of-true'
  | 'scribe-allowance'
  | 'kick-height'
  | 'kick-face-blank'
  | 'appliance-height'
  | 'ceiling-gap'
  | 'ceiling-blank'
  | 'upper-gap'
  | 'tilt-height'
  | 'way-in-margin'
  | 'aisle'
  | 'pipe-offset'
  | 'room-angle-misclosure'
  | 'room-linear-misclosure'
  | 'saw-angle'
  | 'crown-mitre'
  | 'crown-bevel';

/** Rounded to 1e-4 like every output of the fit, so that phone and server agree to the byte. */
export type FitFigure = Figure & { kind: FigureKind };

export type Share = 'within' | 'close' | 'over';

/** What a rule says of a figure, with the rule and its published source. */
export type Verdict = {
  /** Stable key of the check: "wall-straightness", "floor-fall" … */
  check: string;
  /** "Wall B is 7.2 mm out of straight over 2400 mm; the limit is 6 mm." */
  words: string;
  verdict: Share;
  /** The figure's own U spans the limit. */
  inDoubt: boolean;
  /** Past the rule's second level as well. */
  serious: boolean;
  value: FitFigure;
  limitMm: number;
  /** The length over which the limit holds; 0 where it holds for any. */
  spanMm: number;
  /** Name of the rule set: "DIN 18202" … "common practice, no source". */
  rule: string;
  source: string;
  edition: string;
  clause: string;
  /** Where the source was read; empty for common practice. */
  address: string;
  /** What the shop does about it. */
  action: string;
};

/** Names a figure, so that a screen can say how it came about. */
export function fitFigure(kind: FigureKind, { value, u, U, from }: Figure): FitFigure {
  return { value, u, U, from, kind };
}
