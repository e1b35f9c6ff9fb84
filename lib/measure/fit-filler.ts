/** The filler at one end of a run: widths at heights, taper, blank, scribe. */

import { figure } from '@/lib/measure/figure';
import type { FilledEnd } from '@/lib/measure/fill-run';
import type { FitContext } from '@/lib/measure/fit-context';
import { fitFigure } from '@/lib/measure/fit-figure';
import { edgeScribe } from '@/lib/measure/fit-scribe';
import type { EndFiller } from '@/lib/measure/run-fit';
import { scribeAllowance } from '@/lib/measure/scribe';
import type { Problem } from '@/lib/problem';
import { roundBlankUp } from '@/lib/units/round';

/** Narrower than this there is no filler: the box butts against what it meets. */
const NO_FILLER_MM = 0.5;

/**
 * Describes a filler; null where the box butts or the end is open.
 * Edge rule: the blank is the LEAST face width + the unrounded scribe allowance, rounded up once; the
 * allowance itself is shown rounded up to its own step. Units: mm; taper is top less bottom.
 */
export function fitFiller(
  context: FitContext,
  end: 'left' | 'right',
  filled: FilledEnd,
): { filler: EndFiller | null; problems: Problem[] } {
  const first = filled.widths[0];
  const last = filled.widths[filled.widths.length - 1];
  if (filled.isOpen || !first || !last || filled.face.value < NO_FILLER_MM) {
    return { filler: null, problems: [] };
  }
  const { rules, words } = context;
  const us = filled.widths.map(({ width }) => width.u);
  const uShared = Math.min(...us);
  const scribed = scribeAllowance({
    places: filled.widths.map(({ zMm, width, readingId }) => ({
      id: readingId ?? `${end}:${zMm}`,
      atMm: zMm,
      gapMm: width.value,
      u: Math.sqrt(Math.max(0, width.u ** 2 - uShared ** 2)),
    })),
    uShared,
    held: 'by-size',
    rules: {
      marginMm: rules.scribeMarginMm,
      leastMm: rules.scribeLeastMm,
      stepMm: rules.scribeStepMm,
    },
  });
  if (!scribed.value) return { filler: null, problems: scribed.problems };
  const scribe = scribed.value;
  const extreme = (isBetter: (a: number, b: number) => boolean) =>
    filled.widths.reduce((best, one) => (isBetter(one.width.value, best.width.value) ? one : best))
      .width;
  const least = extreme((a, b) => a < b - 1e-6);
  const greatest = extreme((a, b) => a > b + 1e-6);
  const from = [...new Set([...least.from, ...greatest.from])];
  const blankMm = roundBlankUp(least.value + scribe.unrounded.value, rules.stepMm);
  // Held at its limit a filler is as wide as it is meant to be, but no surer than the box beside it is built.
  const blankU = Math.max(scribe.unrounded.u, rules.unitBuildToleranceMm / Math.sqrt(3));
  const taperU = Math.hypot(
    Math.sqrt(Math.max(0, first.width.u ** 2 - uShared ** 2)),
    Math.sqrt(Math.max(0, last.width.u ** 2 - uShared ** 2)),
  );
  const taper = figure(first.width.value - last.width.value, taperU, from);
  return {
    filler: {
      widths: filled.widths.map(({ zMm, width, extrapolated }) => ({
        zMm,
        width: fitFigure('filler-width', width),
        extrapolated,
      })),
      least: fitFigure('filler-width', least),
      greatest: fitFigure('filler-width', greatest),
      taper: fitFigure('filler-taper', taper),
      blank: fitFigure('filler-blank', figure(blankMm, blankU, from)),
      scribe: edgeScribe(`filler-${end}`, `filler, ${end} end`, null, {
        ...scribe,
        outOfTrue: { ...scribe.outOfTrue, from },
        unrounded: { ...scribe.unrounded, from },
      }),
      verdict: filled.verdict,
      words: `${words(first.width.value)} at the top, ${words(last.width.value)} at the bottom; blank ${words(blankMm)}`,
    },
    problems: [],
  };
}
