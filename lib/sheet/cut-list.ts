import type { Run } from '@/lib/contracts/runs';
import type { Fit } from '@/lib/measure/fit';
import type { FitFigure } from '@/lib/measure/fit-figure';
import type { KickCorner, RunFit } from '@/lib/measure/run-fit';
import { type Region, tradeName } from '@/lib/words/trade';
import { unitWords } from './unit-words';

/** One piece that the bench cuts or leaves long. */
export type CutRow = {
  key: string;
  runId: string | null;
  runName: string;
  wallId: string | null;
  /** "Filler, left". */
  piece: string;
  /** At which end (or side) of its run. */
  end: 'left' | 'right' | 'back' | null;
  /** Face at the top and bottom of a filler; at the left and right of a kick face. */
  first: FitFigure | null;
  last: FitFigure | null;
  /** What to cut: a blank, an allowance to leave, an angle at the saw. */
  cut: FitFigure;
  /** "blank", "leave long", "saw". */
  how: 'blank' | 'leave long' | 'saw';
  /** What it is scribed to, or what it lacks. */
  note: string;
  isWrong: boolean;
};

/**
 * The cut list of a fit: fillers, kick faces and their returns, pieces to the ceiling, edges to be left long,
 * mitres.
 *
 * Edge: a run that cannot be filled has no fillers here; its verdict says so. Corners are listed only where
 * runs meet at them.
 * Example: a filler of 46 to 54 mm with an allowance of 17 mm is "Filler, left", 54, 46, blank 63.5 mm.
 */
export function cutList(fit: Fit, runs: readonly Run[], region: Region): CutRow[] {
  return [...fit.runs.flatMap((run) => rowsOf(run, runs, region)), ...mitres(fit, runs, region)];
}

function rowsOf(run: RunFit, runs: readonly Run[], region: Region): CutRow[] {
  const laidOut = runs.find(({ id }) => id === run.runId);
  const unitName = (unitId: string | null) => {
    const unit = laidOut?.units.find(({ id }) => id === unitId);
    return unit ? unitWords(unit, region).toLowerCase() : run.name;
  };
  const common = { runId: run.runId, runName: run.name, wallId: run.wallId };
  const rows: CutRow[] = [];
  for (const side of ['left', 'right'] as const) {
    const { filler } = run[side];
    if (!filler) continue;
    rows.push({
      ...common,
      key: `${run.runId} filler ${side}`,
      piece: `Filler, ${side}`,
      end: side,
      first: filler.widths[0]?.width ?? filler.greatest,
      last: filler.widths.at(-1)?.width ?? filler.least,
      cut: filler.blank,
      how: 'blank',
      note: filler.verdict === 'fits' ? run[side].words : filler.words,
      isWrong: filler.verdict === 'short' || filler.verdict === 'loose',
    });
  }
  for (const scribe of run.scribes) {
    rows.push({
      ...common,
      key: `${run.runId} ${scribe.edge} ${scribe.unitId ?? ''}`,
      piece: `${scribeWords[scribe.edge]}, ${unitName(scribe.unitId)}`,
      end: endOf(scribe.words),
      first: null,
      last: null,
      cut: scribe.allowance,
      how: 'leave long',
      note: scribe.words,
      isWrong: false,
    });
  }
  return [...rows, ...kickRows(run, common, region), ...ceilingRows(run, laidOut, common)];
}

type OfRun = Pick<CutRow, 'runId' | 'runName' | 'wallId'>;

function kickRows(run: RunFit, common: OfRun, region: Region): CutRow[] {
  const { kicks } = run;
  if (!kicks) return [];
  const [firstUnit, lastUnit] = [run.units[0]?.unitId, run.units.at(-1)?.unitId];
  const corner = (unitId: string | undefined, at: KickCorner['corner']) =>
    kicks.corners.find((one) => one.unitId === unitId && one.corner === at)?.height ?? null;
  const isWrong = kicks.corners.some(({ legs }) => legs !== 'within');
  const rows: CutRow[] = [];
  if (kicks.faceBlank) {
    rows.push({
      ...common,
      key: `${run.runId} kick`,
      piece: `${tradeName('kick', region)} face`,
      end: null,
      first: corner(firstUnit, 'front-left'),
      last: corner(lastUnit, 'front-right'),
      cut: kicks.faceBlank.blank,
      how: 'blank',
      note: kicks.faceBlank.scribe.words,
      isWrong,
    });
  }
  // Seen from outside: a return's own left and right.
  const seen = {
    left: [corner(firstUnit, 'back-left'), corner(firstUnit, 'front-left')],
    right: [corner(lastUnit, 'front-right'), corner(lastUnit, 'back-right')],
    back: [corner(lastUnit, 'back-right'), corner(firstUnit, 'back-left')],
  } as const;
  for (const { side, blank, scribe } of kicks.returns) {
    rows.push({
      ...common,
      key: `${run.runId} kick ${side}`,
      piece: `${tradeName('kick', region)} return, ${side}`,
      end: side,
      first: seen[side][0],
      last: seen[side][1],
      cut: blank,
      how: 'blank',
      note: scribe.words,
      isWrong,
    });
  }
  return rows;
}

function ceilingRows(run: RunFit, laidOut: Run | undefined, common: OfRun): CutRow[] {
  const { ceiling } = run;
  if (!ceiling) return [];
  const isCrowned = laidOut?.overBoxes === 'crown';
  const rows: CutRow[] = [];
  if (ceiling.blank) {
    rows.push({
      ...common,
      key: `${run.runId} ceiling`,
      piece: isCrowned ? 'Backing of the crown' : 'Filler to the ceiling',
      end: null,
      first: ceiling.left,
      last: ceiling.right,
      cut: ceiling.blank,
      how: 'blank',
      note: ceiling.scribe?.words ?? '',
      isWrong: ceiling.least.value - ceiling.least.U < 0,
    });
  }
  for (const { end, mitre, bevel, corner } of ceiling.crown ?? []) {
    rows.push({
      ...common,
      key: `${run.runId} crown ${end}`,
      piece: `Crown, ${end}`,
      end,
      first: null,
      last: null,
      cut: mitre,
      how: 'saw',
      note: `flat on the saw, blade tilted ${bevel.value.toFixed(1)}°; ${corner} corner`,
      isWrong: false,
    });
  }
  return rows;
}

function mitres(fit: Fit, runs: readonly Run[], region: Region): CutRow[] {
  const meet = new Set(
    runs.flatMap((run) => [
      ...(run.left.kind === 'run' ? [`left ${run.wallId}`] : []),
      ...(run.right.kind === 'run' ? [`right ${run.wallId}`] : []),
    ]),
  );
  return fit.corners.flatMap((corner) => {
    const isMet = meet.has(`left ${corner.cornerWallId}`) || meet.has(`right ${corner.leftWallId}`);
    if (!corner.saw || !isMet) return [];
    return [
      {
        key: `${corner.cornerWallId} saw`,
        runId: null,
        runName: `Corner ${corner.name}`,
        wallId: corner.cornerWallId,
        piece: `${tradeName('kick', region)} mitre, each piece`,
        end: null,
        first: null,
        last: null,
        cut: corner.saw,
        how: 'saw',
        note: 'half the corner as it is',
        isWrong: false,
      } satisfies CutRow,
    ];
  });
}

const scribeWords = {
  'filler-left': 'Filler left',
  'filler-right': 'Filler right',
  'finished-end': 'Finished end',
  ceiling: 'To the ceiling',
  kick: 'Kick',
} as const;

/** "finished end, left" is at the left. */
function endOf(words: string): CutRow['end'] {
  return words.endsWith(', left') ? 'left' : words.endsWith(', right') ? 'right' : null;
}
