import type { FitRules } from '@/lib/contracts/shop-rules';
import type { Fit } from '@/lib/measure/fit';
import type { FitFigure } from '@/lib/measure/fit-figure';
import type { RunFit } from '@/lib/measure/run-fit';
import { formatLength } from '@/lib/units/format-length';
import { roundedMm } from './figure-text';

/**
 * The cut sizes of two fits that differ after rounding, and the runs whose verdict turned, in words.
 *
 * Edge: a piece that is in one fit only is told as new or gone; a run that is in one only is left to
 * `runChanges`.
 * Example: `Sink wall, filler left: blank 2 1/2" is now 2 3/4"`.
 */
export function cutChanges(before: Fit, after: Fit, rules: FitRules): string[] {
  const { unit, stepMm } = rules;
  const length = (mm: number) => formatLength(mm, { unit, stepMm });
  const changes: string[] = [];
  for (const run of after.runs) {
    const was = before.runs.find(({ runId }) => runId === run.runId);
    if (!was) continue;
    if (was.fill && run.fill && was.fill.verdict !== run.fill.verdict) {
      changes.push(`${run.name}: ${run.fill.verdict}, was ${was.fill.verdict}`);
    }
    const blanksBefore = blanksOf(was, stepMm);
    const blanksNow = blanksOf(run, stepMm);
    for (const [piece, blankMm] of blanksNow) {
      const old = blanksBefore.get(piece);
      if (old === undefined) changes.push(`${run.name}, ${piece}: new, blank ${length(blankMm)}`);
      else if (Math.abs(old - blankMm) > 1e-6) {
        changes.push(`${run.name}, ${piece}: blank ${length(old)} is now ${length(blankMm)}`);
      }
    }
    for (const piece of blanksBefore.keys()) {
      if (!blanksNow.has(piece)) changes.push(`${run.name}, ${piece}: gone`);
    }
  }
  return changes;
}

function blanksOf(run: RunFit, stepMm: number): Map<string, number> {
  const blanks = new Map<string, number>();
  const add = (piece: string, blank: FitFigure | undefined) => {
    if (blank) blanks.set(piece, roundedMm(blank, stepMm));
  };
  add('filler left', run.left.filler?.blank);
  add('filler right', run.right.filler?.blank);
  add('kick face', run.kicks?.faceBlank?.blank);
  for (const { side, blank } of run.kicks?.returns ?? []) add(`kick return ${side}`, blank);
  add('piece to the ceiling', run.ceiling?.blank ?? undefined);
  return blanks;
}
