import { MOST_POINTS, MOST_STROKES, PEN_FIELD } from './pen-field';

type Stroke = [number, number][];

/**
 * A signature as it is kept: within the field, to a tenth of a point, and never more points than the record
 * takes, whatever a hand does.
 *
 * Edge: too many strokes lose the last ones, too many points every second one, until they fit; a stroke
 * keeps its ends. Example: a point at x 610 of a field 600 wide is kept at 600.
 */
export function keptStrokes(strokes: readonly Stroke[]): Stroke[] {
  let kept = strokes
    .filter((stroke) => stroke.length > 0)
    .slice(0, MOST_STROKES)
    .map((stroke) =>
      stroke.map(([x, y]): [number, number] => [held(x, 'width'), held(y, 'height')]),
    );
  while (countOf(kept) > MOST_POINTS || kept.some(({ length }) => length > MOST_POINTS / 6)) {
    const thinner = kept.map(thinned);
    if (countOf(thinner) === countOf(kept)) return thinner;
    kept = thinner;
  }
  return kept;
}

const countOf = (strokes: readonly Stroke[]) =>
  strokes.reduce((sum, { length }) => sum + length, 0);

function thinned(stroke: Stroke): Stroke {
  return stroke.filter((_point, at) => at % 2 === 0 || at === stroke.length - 1);
}

function held(value: number, side: 'width' | 'height'): number {
  return Math.round(Math.min(PEN_FIELD[side], Math.max(0, value)) * 10) / 10;
}
