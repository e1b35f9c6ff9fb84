import type { ReadingOf } from '@/lib/contracts/readings';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { Tool } from '@/lib/contracts/wall-book';
import { ruleFor } from '@/lib/measure/check-rule';
import type { Figure } from '@/lib/measure/figure';
import { plumbOf } from '@/lib/measure/plumb';
import type { ProfilePoint } from '@/lib/measure/profile';
import { ruleSetsOf } from '@/lib/measure/rules/rule-sets';
import { straightedgeGap } from '@/lib/measure/straightedge-gap';
import { straightness } from '@/lib/measure/straightness';
import { lengthOwnPart, slopeUncertainty } from '@/lib/measure/uncertainty';
import { type JudgeInput, judgedBy, type PadVerdict, worstOf } from './pad-verdict';
import { sayDifference, sayLength, sayPlusMinus } from './say-length';

type Face = ReadingOf<'face'>;
const SAME_PLACE_MM = 1;

/**
 * A gap with the others of its set-up: how far out of straight along its row, out of plumb up its column.
 *
 * Edge: a straightedge says nothing of plumb; one gap alone says nothing.
 * Example: gaps 3, 0, 3 at one height: a bulge of 1/8".
 * Source: the rule set that the shop has picked, else its own.
 */
export function verdictOfFace(input: JudgeInput<Face>): PadVerdict {
  const { reading, others } = input;
  const together = [
    ...others.filter(
      (other): other is Face =>
        other.kind === 'face' &&
        other.setUpId === reading.setUpId &&
        other.wallId === reading.wallId,
    ),
    reading,
  ];
  const verdicts = [rowVerdict(input, together), columnVerdict(input, together)];
  const said = worstOf(verdicts.filter((verdict) => verdict !== null));
  if (said) return said;
  const count = together.length;
  return {
    kind: 'note',
    words: count === 1 ? 'First gap of this set-up.' : `${count} gaps in this set-up.`,
  };
}

function rowVerdict({ reading, tool, rules }: JudgeInput<Face>, faces: Face[]): PadVerdict | null {
  const row = faces.filter(({ zMm }) => Math.abs(zMm - reading.zMm) <= SAME_PLACE_MM);
  const points = row.map((face) => pointOf(face, face.xMm, tool));
  const { value } = straightness(points);
  if (!value) return null;
  const { minimumZone, shape } = value;
  const { kind, by } = judgedRow(points, minimumZone, rules);
  if (shape === 'straight') return { kind, by, words: 'Straight within the reading.' };
  const seen = { hollow: 'Hollow by', bulge: 'Bulges', wavy: 'Wavy by' }[shape];
  const size = `${sayDifference(minimumZone.value, rules)} ${sayPlusMinus(minimumZone.U, rules)}`;
  return { kind, by, words: `${seen} ${size} along this row.` };
}

/** By the gap under the straightedge that the rule lays on the wall, or by the row as a whole. */
function judgedRow(points: ProfilePoint[], wholeRow: Figure, rules: FitRules) {
  const edgeMm = ruleFor(ruleSetsOf(rules), 'wall-straightness')?.rule.overMm ?? null;
  const under = edgeMm === null ? null : straightedgeGap(points, edgeMm).value;
  const places = points.map(({ atMm }) => atMm);
  const spanMm = Math.max(...places) - Math.min(...places);
  return judgedBy(rules, 'wall-straightness', under?.gap ?? wholeRow, spanMm);
}

function columnVerdict(
  { reading, tool, rules }: JudgeInput<Face>,
  faces: Face[],
): PadVerdict | null {
  if (reading.setUpKind === 'straightedge') return null;
  const column = faces.filter(({ xMm }) => Math.abs(xMm - reading.xMm) <= SAME_PLACE_MM);
  const heights = column.map(({ zMm }) => zMm);
  const overMm = Math.max(...heights) - Math.min(...heights);
  if (overMm <= SAME_PLACE_MM) return null;
  const uReference = slopeUncertainty(tool);
  const points = column.map((face) => pointOf(face, face.zMm, tool));
  const { value } = plumbOf({ points, uReference, overMm });
  if (!value) return null;
  const { over, leans } = value;
  const { kind, by, serious } = judgedBy(rules, 'wall-plumb', over, overMm);
  const span = `over ${sayLength(overMm, rules)}`;
  if (leans === 'plumb') return { kind, by, words: `Plumb within the reading ${span}.` };
  const size = `${sayDifference(over.value, rules)} ${sayPlusMinus(over.U, rules)}`;
  const way = leans === 'in' ? 'Leans into the room' : 'Leans away';
  return { kind, by, words: `${way} ${size} ${span}${serious ? ': serious' : ''}.` };
}

/** A face falls back where its gap is large. */
function pointOf(face: Face, atMm: number, tool: Tool): ProfilePoint {
  return { id: face.id, atMm, sMm: -face.gapMm, u: lengthOwnPart(tool) };
}
