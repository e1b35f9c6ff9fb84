import type { ReadingOf } from '@/lib/contracts/readings';
import type { Run } from '@/lib/contracts/runs';
import { cornerDeviation } from '@/lib/measure/corner-deviation';
import { walkRoom } from '@/lib/measure/room-walk';
import { angleOfReading } from './angle-of-reading';
import { type JudgeInput, judgedBy, type PadVerdict } from './pad-verdict';
import { sayDifference, sayLength, sayPlusMinus } from './say-length';

const DEGREES = 180 / Math.PI;

/**
 * A corner against the angle it was drawn with, as what it takes over the depth of the cabinet there.
 *
 * Edge: smaller than its U it is "true within the reading". Judged over the depth of the cabinet by the rule
 * set that the shop has picked.
 * Example: 89.4° ± 0.2° over 24": closed, 1/4" in the way at the front.
 * Problems of `cornerAngle` come as `over` with their words. Source: the rule's own.
 */
export function verdictOfCorner(input: JudgeInput<ReadingOf<'corner'>>): PadVerdict {
  const { reading, tool, book, runs, rules } = input;
  const { value: angle, problems } = angleOfReading(reading, tool);
  if (!angle) return { kind: 'over', words: problems[0]?.message ?? 'This cannot be a corner.' };
  const placed = walkRoom(book.room).byId.get(reading.cornerWallId);
  const nominal = placed?.leftCornerDeg ?? 90;
  const said = `${angle.value.toFixed(1)}° ± ${plusDegrees(angle.U)}°`;
  const { deviation, lies } = cornerDeviation(angle, nominal);
  const depthMm =
    depthAt(runs, [reading.cornerWallId, placed?.before?.id]) ?? rules.cornerFlagOverMm;
  const outMm = depthMm * Math.tan(deviation.value / DEGREES);
  const expandedMm = (depthMm * deviation.U) / DEGREES / Math.cos(deviation.value / DEGREES) ** 2;
  const { kind, by } = judgedBy(rules, 'corner-square', { value: outMm, U: expandedMm }, depthMm);
  const over = `over ${sayLength(depthMm, rules)}`;
  if (lies === 'true-within-the-reading') {
    const sure = `${sayPlusMinus(expandedMm, rules)} ${over}`;
    return { kind, by, words: `True within the reading: ${said}, ${sure}.` };
  }
  const size = sayDifference(outMm, rules);
  const effect = lies === 'closed' ? `Closed: takes ${size}` : `Open: gives ${size}`;
  return { kind, by, words: `${effect} ${sayPlusMinus(expandedMm, rules)} ${over}. ${said}.` };
}

/** The deepest cabinet on the walls of the corner, to its door fronts. */
function depthAt(runs: Run[], wallIds: (string | undefined)[]): number | null {
  const depths = runs
    .filter(({ wallId }) => wallIds.includes(wallId))
    .map(({ carcassDepthMm, bumperMm, doorMm }) => carcassDepthMm + bumperMm + doorMm);
  return depths.length > 0 ? Math.max(...depths) : null;
}

/** Up to a tenth of a degree: how sure is never said too small. */
function plusDegrees(expandedDeg: number): string {
  return (Math.ceil(expandedDeg * 10 - 1e-9) / 10).toFixed(1);
}
