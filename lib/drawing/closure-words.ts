import type { FitRules } from '@/lib/contracts/shop-rules';
import type { Room } from '@/lib/contracts/wall-book';
import type { ProvedRoom } from '@/lib/measure/prove-room';
import { figureText } from '@/lib/sheet/figure-text';
import { cornerName } from '@/lib/sheet/room-names';
import { formatLength } from '@/lib/units/format-length';
import { roundBlankUp } from '@/lib/units/round';
import { askedDiagonals } from './asked-diagonals';
import { sureFactor } from './closure-frame';
import type { ClosureDrawing } from './closure-picture';
import { slipWords } from './suspects';

type Steps = Pick<FitRules, 'unit' | 'stepMm'>;

/**
 * What the suspect is and what would settle it, in one sentence.
 *
 * Edge: null without a suspect; where no diagonal is asked for, only the reading again.
 * Example: "Wall C, length at the counter: 100 mm too long? Measure it again, or take the diagonal from corner
 * D–A to corner C–D to settle it."
 */
export function suspectAdvice(fit: ProvedRoom, room: Room, rules: Steps): string | null {
  const readings = fit.closure.suspect?.readings ?? [];
  const [first] = readings;
  if (!first) return null;
  const [asked] = askedDiagonals(fit);
  const corner = (id: string) => `corner ${cornerName(room, id)}`;
  const diagonal = asked
    ? `, or take the diagonal from ${corner(asked.fromCornerWallId)} to ${corner(asked.toCornerWallId)} to settle it`
    : '';
  const others = readings.length - 1;
  const alike =
    others === 0
      ? ''
      : ` ${others === 1 ? 'One other reading' : `${others} other readings`} would explain it as well.`;
  return `${first.words}: ${slipWords(first, rules)} Measure it again${diagonal}.${alike}`;
}

/**
 * What the closure picture shows, in words: how far the walk fails to meet its start, how sure the corners
 * are, and how much larger each is drawn.
 *
 * Edge: an open chain has no walk to close, and says so. U is rounded up.
 * Example: "Walked round as read, the room fails to meet its start by 9/16″ ± 3/8″ (1 in 919), drawn ×20."
 */
export function closureSays(fit: ProvedRoom, drawing: ClosureDrawing, rules: Steps): string[] {
  return [walkWords(fit, drawing, rules), ellipseWords(fit, drawing, rules)];
}

function walkWords({ closure }: ProvedRoom, { walkFactor }: ClosureDrawing, rules: Steps): string {
  const closed = closure.chains.find(({ linear }) => linear !== null);
  if (!closed?.linear) {
    return closure.chains.some(({ closed: isClosed }) => isClosed)
      ? 'The walk round the room is not read through yet.'
      : 'These walls do not go all round, so there is no walk to close: the diagonals alone check them.';
  }
  const { value, surely } = figureText(closed.linear, rules);
  const ratio = closed.relativePrecision
    ? ` (1 in ${Math.round(closed.relativePrecision).toLocaleString('en')})`
    : '';
  return `Walked round as read, the room fails to meet its start by ${value} ± ${surely}${ratio}${drawnWords(walkFactor)}.`;
}

function ellipseWords(
  { closure }: ProvedRoom,
  { ellipseFactor }: ClosureDrawing,
  { unit, stepMm }: Steps,
): string {
  const reachesMm = (closure.adjustment?.corners ?? []).map(({ ellipse }) => ellipse.aMm);
  const mostMm = Math.max(0, ...reachesMm) * sureFactor;
  const fine = unit === 'in' ? 25.4 / 64 : Math.min(stepMm, 0.5);
  const reach = formatLength(roundBlankUp(mostMm, fine), { unit, stepMm: fine });
  return `Evened out with every length, angle and diagonal, each corner lies inside its ellipse 95 times out of 100, seen from the corner marked by a square; the largest reaches ${reach}${drawnWords(ellipseFactor)}.`;
}

const drawnWords = (factor: number) => (factor === 1 ? '' : `, drawn ×${factor}`);
