/** The corners that a crown over a run turns, as the saw must be set. */
import type { Run } from '@/lib/contracts/runs';
import { type Figure, figure } from '@/lib/measure/figure';
import type { FitContext } from '@/lib/measure/fit-context';
import { fitFigure } from '@/lib/measure/fit-figure';
import { crownMitre } from '@/lib/measure/mitre';
import type { CrownCut } from '@/lib/measure/run-fit';

/** A finished end is built square: the crown turns back to the wall round an outside corner. */
const ROUND_A_SQUARE_END: Figure = figure(270, 0, []);

/**
 * One cut for each end where the crown goes on: round a finished end, or into the crown of the run that
 * meets it, at the corner as adjusted. Against a wall it is butted or coped, and has no cut here.
 * Edge rule: a corner that nobody read gives no cut. Units: degrees; spring between the moulding's back and
 * the wall, the shop's rule, taken as exact. Example: 38°, a finished end: mitre 31.6°, blade 33.9°, outside.
 * Problems: none. Source: `crownMitre`.
 */
export function crownCuts(context: FitContext, run: Run): CrownCut[] {
  const spring = { value: context.rules.crownSpringDeg, u: 0, from: [] };
  return (['left', 'right'] as const).flatMap((end): CrownCut[] => {
    const corner = run[end].kind === 'open' ? ROUND_A_SQUARE_END : cornerAt(context, run, end);
    const cut = corner && crownMitre(spring, corner).value;
    if (!cut) return [];
    const { mitre, bevel } = cut;
    return [
      {
        end,
        mitre: fitFigure('crown-mitre', mitre),
        bevel: fitFigure('crown-bevel', bevel),
        corner: cut.corner,
      },
    ];
  });
}

function cornerAt(context: FitContext, run: Run, end: 'left' | 'right'): Figure | null {
  if (run[end].kind !== 'run') return null;
  const walked = context.walk.byId.get(run.wallId);
  const cornerWallId = end === 'left' ? run.wallId : walked?.after?.id;
  if (!context.corners.some((corner) => corner.cornerWallId === cornerWallId)) return null;
  const found = context.room?.angles.find((angle) => angle.cornerWallId === cornerWallId);
  return found?.angleDeg ?? null;
}
