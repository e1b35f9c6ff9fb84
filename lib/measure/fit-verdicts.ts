/** What the shop's rules say of a fit. */
import { checkRule, ruleFor } from '@/lib/measure/check-rule';
import { figure } from '@/lib/measure/figure';
import type { CornerFit, FloorFit, WallFit } from '@/lib/measure/fit';
import type { FoundAisle } from '@/lib/measure/fit-aisles';
import type { FitContext } from '@/lib/measure/fit-context';
import { type FitFigure, fitFigure, type Verdict } from '@/lib/measure/fit-figure';
import { piecesAgainstWhole } from '@/lib/measure/pieces-against-whole';
import { heightWords } from '@/lib/measure/plan-context';
import type { CheckKind, RuleSet } from '@/lib/measure/rules/rule-set';
import type { RunFit } from '@/lib/measure/run-fit';

/** The straightedge laid where the rule names none and the row is longer. */
const STRAIGHTEDGE_MM = 2_000;

export type Judge = (check: CheckKind, what: string, value: FitFigure, spanMm: number) => Verdict[];

/** Judges by the rule sets in order; nothing where none limits the check. */
export function judgeBy(context: FitContext, ruleSets: readonly RuleSet[]): Judge {
  return (check, what, value, spanMm) => {
    const judged = checkRule(ruleSets, check, value, spanMm).value;
    if (!judged) return [];
    const { verdict, inDoubt, serious, limitMm, rule, source, edition, clause, address, action } =
      judged;
    const { words } = context;
    const over = judged.spanMm > 0 ? ` over ${words(judged.spanMm)}` : '';
    const limit = check === 'aisle' ? 'the least is' : 'the limit is';
    const size = words(Math.abs(value.value));
    // On the shop's step it may look the same as the limit that it is past.
    const isJustPast = verdict === 'over' && size === words(limitMm);
    const justPast = check === 'aisle' ? 'just under ' : 'just over ';
    return [
      {
        check,
        words: `${what}: ${isJustPast ? justPast : ''}${size}${over}; ${limit} ${words(limitMm)}.`,
        verdict,
        inDoubt,
        serious,
        value,
        limitMm,
        spanMm: judged.spanMm,
        rule,
        source,
        edition,
        clause,
        address,
        action,
      },
    ];
  };
}

/** How long a straightedge the picked rule lays on a wall. */
export function straightedgeOf(ruleSets: readonly RuleSet[]): number {
  return ruleFor(ruleSets, 'wall-straightness')?.rule.overMm ?? STRAIGHTEDGE_MM;
}

/** The worst row and the worst column of a wall. */
export function wallVerdicts(judge: Judge, wall: WallFit, isOverEdge: boolean): Verdict[] {
  const rows = wall.rows.flatMap((row) => {
    const [first, last] = [row.points[0], row.points[row.points.length - 1]];
    const lengthMm = (last?.xMm ?? 0) - (first?.xMm ?? 0);
    const value = isOverEdge ? row.straightedge?.gap : row.outOfStraight;
    if (!value) return [];
    return judge('wall-straightness', `Wall ${wall.name}, straight`, value, lengthMm);
  });
  const columns = wall.columns.flatMap(({ over, heightMm }) =>
    judge('wall-plumb', `Wall ${wall.name}, plumb`, over, heightMm),
  );
  return [...worstOf(rows), ...worstOf(columns)];
}

/** What the pieces of a wall make beside its whole, at each height that has both. */
export function piecesVerdicts(judge: Judge, context: FitContext, wall: WallFit): Verdict[] {
  return piecesAgainstWhole(context.lengths, wall.wallId).flatMap(({ zMm, difference }) =>
    judge(
      'pieces-against-whole',
      `Wall ${wall.name}, pieces against the whole ${heightWords(zMm, context.rules)}`,
      fitFigure('pieces-against-whole', difference),
      0,
    ),
  );
}

/** Out of square over the depth of what stands there. */
export function cornerVerdicts(judge: Judge, corner: CornerFit, depthMm: number): Verdict[] {
  const { deviation } = corner;
  if (!deviation) return [];
  const radians = (deviation.value * Math.PI) / 180;
  const out = figure(
    depthMm * Math.tan(radians),
    (depthMm * deviation.u * (Math.PI / 180)) / Math.cos(radians) ** 2,
    deviation.from,
  );
  const value = fitFigure('corner-offset', out);
  return judge('corner-square', `Corner ${corner.name}, square`, value, depthMm);
}

/** The floor under the run as a whole, and the ceiling over it. */
export function runVerdicts(judge: Judge, run: RunFit): Verdict[] {
  const { kicks, ceiling } = run;
  const lengthMm = lengthOf(run);
  const verdicts: Verdict[] = [];
  if (kicks) {
    const { least, greatest } = kicks;
    const from = [...new Set([...least.from, ...greatest.from])];
    const fall = figure(greatest.value - least.value, Math.hypot(least.u, greatest.u), from);
    const value = fitFigure('floor-fall', fall);
    verdicts.push(...judge('floor-fall', `Floor under ${run.name}`, value, lengthMm));
  }
  if (ceiling) {
    const { left, right } = ceiling;
    const from = [...new Set([...left.from, ...right.from])];
    const fall = figure(left.value - right.value, Math.hypot(left.u, right.u), from);
    const value = fitFigure('ceiling-gap', fall);
    verdicts.push(...judge('ceiling-fall', `Ceiling over ${run.name}`, value, lengthMm));
  }
  if (run.aisle) {
    verdicts.push(...judge('aisle', `Aisle in front of ${run.name}`, run.aisle.figure, 0));
  }
  return verdicts;
}

function lengthOf({ setLine, units }: RunFit): number {
  const [first, last] = [units[0], units[units.length - 1]];
  if (first && last) return last.rightMm - first.leftMm;
  return setLine ? setLine.xRightMm - setLine.xLeftMm : 0;
}

/** The floor of the whole room, over the distance from its high to its low point. */
export function floorVerdicts(judge: Judge, floor: FloorFit, spanMm: number): Verdict[] {
  return judge('floor-fall', 'Floor of the room', floor.fall, spanMm);
}

const RANK = { over: 0, close: 1, within: 2 };

/** Worst first: over before close, then by the share of the limit; the order given among equals. */
export function worstFirst(verdicts: Verdict[]): Verdict[] {
  const share = ({ check, value, limitMm }: Verdict) =>
    check === 'aisle'
      ? limitMm / Math.max(Math.abs(value.value), 1e-9)
      : Math.abs(value.value) / Math.max(limitMm, 1e-9);
  return verdicts
    .map((verdict, order) => ({ verdict, order }))
    .sort(
      (a, b) =>
        RANK[a.verdict.verdict] - RANK[b.verdict.verdict] ||
        share(b.verdict) - share(a.verdict) ||
        a.order - b.order,
    )
    .map(({ verdict }) => verdict);
}

function worstOf(verdicts: Verdict[]): Verdict[] {
  return worstFirst(verdicts).slice(0, 1);
}

/** The least aisle in front of each run. */
export function aisleOf(runId: string, aisles: FoundAisle[]): RunFit['aisle'] {
  let found: RunFit['aisle'] = null;
  for (const { fromRunId, toRunId, aisle } of aisles) {
    if (fromRunId !== runId && toRunId !== runId) continue;
    if (found && found.figure.value <= aisle.value) continue;
    const other = fromRunId === runId ? toRunId : fromRunId;
    found = { toRunId: other, figure: fitFigure('aisle', aisle) };
  }
  return found;
}
