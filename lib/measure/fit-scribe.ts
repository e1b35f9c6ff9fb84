/** A scribe allowance as the fit shows it. */
import { fitFigure } from '@/lib/measure/fit-figure';
import type { EdgeScribe } from '@/lib/measure/run-fit';
import type { ScribeAllowance } from '@/lib/measure/scribe';

/** Names the edge and its figures. */
export function edgeScribe(
  edge: EdgeScribe['edge'],
  words: string,
  unitId: string | null,
  scribe: ScribeAllowance,
): EdgeScribe {
  return {
    words,
    edge,
    unitId,
    outOfTrue: fitFigure('edge-out-of-true', scribe.outOfTrue),
    allowance: fitFigure('scribe-allowance', scribe.unrounded),
    allowanceRoundedUpMm: scribe.roundedUpMm,
  };
}
