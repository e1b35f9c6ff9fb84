import type { FitRules } from '@/lib/contracts/shop-rules';
import type { FitFigure, Share } from '@/lib/measure/fit-figure';
import type { OpeningPlace, RunFit, RunVerdict } from '@/lib/measure/run-fit';
import { figureText } from '@/lib/sheet/figure-text';
import { formatLength } from '@/lib/units/format-length';
import { tradeName } from '@/lib/words/trade';

/** How loud a run's verdict is beside those of the rules. */
export const shareOfRun: Record<RunVerdict, Share> = {
  fits: 'within',
  tight: 'close',
  loose: 'close',
  short: 'over',
};

/**
 * What the room leaves a run, one sentence each: what it meets, the plumb block and what governs it, the gap
 * behind, the heights. Its fillers stand in the drawing and in the cut list.
 *
 * Edge: what is not known is left out; a figure is rounded the way its kind asks for.
 * Example: `Largest plumb block 138 15/16" ± 1/8": left decides front edge, at the top; right …`.
 */
export function runFacts(run: RunFit, rules: FitRules): string[] {
  const sure = (figure: FitFigure) => {
    const { value, surely } = figureText(figure, rules);
    return `${value} ± ${surely}`;
  };
  const { fill, setLine, upperGap, ceiling, kicks } = run;
  return [
    endsWords(run, rules),
    openingWords(run, sure),
    fill?.suggestion ? `To make it fit: ${fill.suggestion.words}` : '',
    setLine ? behindWords(setLine, sure, rules) : '',
    kicks
      ? `${tradeName('kick', rules.region)} ${figureText(kicks.least, rules).value} to ${sure(kicks.greatest)}. ${kicks.words}`
      : '',
    upperGap ? upperGapWords(upperGap, rules) : '',
    ceiling ? `To the ceiling: ${ceiling.words}.` : '',
  ].filter((words) => words !== '');
}

/** Nothing is read between two heights that are set out from one level line, so nothing is unsure. */
function upperGapWords(gap: FitFigure, rules: FitRules): string {
  const { value, surely } = figureText(gap, rules);
  const words = gap.U > 0 ? `${value} ± ${surely}` : `${value}, both set out from one level line`;
  return `Counter to the boxes above: ${words}.`;
}

function endsWords({ left, right }: RunFit, rules: FitRules): string {
  const [leftWords, rightWords] = [left, right].map(({ words, freeRoom, filler, meets }) => {
    if (freeRoom) return `ends free, ${figureText(freeRoom, rules).value} to its limit`;
    if (words === '') return '';
    return filler || meets === 'open' ? `meets ${words}` : `butts against ${words}`;
  });
  const ends = [leftWords ? `Left ${leftWords}` : '', rightWords ? `right ${rightWords}` : ''];
  const sentence = ends.filter((words) => words !== '').join('; ');
  return sentence === '' ? '' : `${sentence.charAt(0).toUpperCase()}${sentence.slice(1)}.`;
}

function openingWords({ clearOpening, fill }: RunFit, sure: (figure: FitFigure) => string): string {
  if (!clearOpening) return '';
  const { left, right } = clearOpening.governing;
  const decides = `left decides ${placeWords(left)}; right ${placeWords(right)}`;
  const slack = fill ? ` Slack ${sure(fill.slack)}.` : '';
  return `Largest plumb block ${sure(clearOpening.opening)}: ${decides}.${slack}`;
}

function behindWords(
  { greatestGap, rocks, wallToCut, assumed }: NonNullable<RunFit['setLine']>,
  sure: (figure: FitFigure) => string,
  rules: FitRules,
): string {
  if (assumed) return 'The wall behind was not read: taken as straight from corner to corner.';
  const rocking = rocks ? '; it touches one place only: shim the ends' : '';
  const cut = wallToCut.map(
    ({ xMm, proud }) => `; cut the wall back ${sure(proud)} at ${formatLength(xMm, rules)}`,
  );
  return `Largest gap behind ${sure(greatestGap)}${rocking}${cut.join('')}.`;
}

/** "front edge, at the floor": the end is said before. */
function placeWords({ words, extrapolated }: OpeningPlace): string {
  const place = words.replace(/^(left|right) end,? ?/i, '');
  return extrapolated ? `${place} (not read there)` : place;
}
