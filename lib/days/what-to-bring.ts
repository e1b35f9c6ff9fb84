import type { Run, Unit } from '@/lib/contracts/runs';
import type { FitRules } from '@/lib/contracts/shop-rules';
import type { Fit } from '@/lib/measure/fit';
import { unitWords } from '@/lib/sheet/unit-words';
import { roundBlankUp } from '@/lib/units/round';
import { shortOfStuds } from './short-of-studs';

export type BringItem =
  /** Strips of one length; the widest blank of them. */
  | { what: 'filler'; count: number; lengthMm: number; widestMm: number }
  | { what: 'kick'; lengthMm: number; tallestMm: number }
  | { what: 'crown'; lengthMm: number }
  | { what: 'legs'; count: number; leastMm: number; mostMm: number }
  | { what: 'shims'; runs: string[] }
  | { what: 'backing'; units: string[] }
  | { what: 'scribe-tools' | 'fixings' | 'finder' | 'level' | 'protection' };

type Set = { runs: readonly Run[]; fit: Fit; rules: Pick<FitRules, 'stepMm'> };

/** Boxes that stand on legs or a kick base; the rest are appliances, panels and gaps. */
const standsOnLegs = new Set(['base', 'drawers', 'sink', 'corner', 'tall']);

/**
 * What a crew loads for these rooms: filler stock by length, kick and crown stock, legs, shims, backing, and
 * the tools that the fit calls for.
 *
 * A filler is as long as its run is high; the widest blank of a length is what the stock must give. Four legs
 * a box, from the least to the greatest height that the kicks need. Units: mm; blanks and lengths go up to
 * the shop's step. Edge: nothing released gives the tools alone.
 * Example: two fillers of 762 with blanks 63 and 92: { filler, 2, 762, 92 }.
 * Source: the fit; tools by common practice (S07, S12, S17).
 */
export function whatToBring(
  sets: readonly Set[],
  nameOf: (unit: Unit) => string = unitWords,
): BringItem[] {
  const fillers = new Map<number, { count: number; widestMm: number }>();
  const units = sets.flatMap((set) => set.runs.flatMap((run) => run.units));
  const fits = sets.flatMap((set) => set.fit.runs);
  for (const { runs, fit, rules } of sets) {
    for (const run of runs) {
      const ofRun = fit.runs.find(({ runId }) => runId === run.id);
      const lengthMm = roundBlankUp(run.z1Mm - run.z0Mm, rules.stepMm);
      for (const filler of [ofRun?.left.filler, ofRun?.right.filler]) {
        if (!filler) continue;
        const before = fillers.get(lengthMm) ?? { count: 0, widestMm: 0 };
        const blankMm = roundBlankUp(filler.blank.value - 1e-4, rules.stepMm);
        fillers.set(lengthMm, {
          count: before.count + 1,
          widestMm: Math.max(before.widestMm, blankMm),
        });
      }
    }
  }
  const spanOf = ({ units: placed }: Fit['runs'][number]) =>
    (placed.at(-1)?.rightMm ?? 0) - (placed[0]?.leftMm ?? 0);
  const kicked = fits.filter(({ kicks }) => kicks !== null);
  const kicks = kicked.flatMap((run) => (run.kicks ? [run.kicks] : []));
  const crowned = fits.filter(({ ceiling }) => ceiling?.scribe);
  const rocking = fits.filter(({ setLine }) => setLine?.rocks).map(({ name }) => name);
  const onLegs = units.filter(({ kind }) => standsOnLegs.has(kind)).length;
  const hasScribes = fillers.size > 0 || fits.some(({ scribes }) => scribes.length > 0);
  const short = sets.flatMap(({ runs, fit }) => shortOfStuds(runs, fit, nameOf));
  return [
    ...[...fillers]
      .sort(([one], [other]) => other - one)
      .map(([lengthMm, stock]) => ({ what: 'filler' as const, lengthMm, ...stock })),
    ...(kicks.length > 0
      ? [
          {
            what: 'kick' as const,
            lengthMm: sum(kicked.map(spanOf)),
            tallestMm: Math.max(
              ...kicks.map(({ faceBlank, greatest }) => faceBlank?.blank.value ?? greatest.value),
            ),
          },
        ]
      : []),
    ...(crowned.length > 0 ? [{ what: 'crown' as const, lengthMm: sum(crowned.map(spanOf)) }] : []),
    ...(kicks.length > 0 && onLegs > 0
      ? [
          {
            what: 'legs' as const,
            count: onLegs * 4,
            leastMm: Math.min(...kicks.map(({ least }) => least.value)),
            mostMm: Math.max(...kicks.map(({ greatest }) => greatest.value)),
          },
        ]
      : []),
    ...(rocking.length > 0 ? [{ what: 'shims' as const, runs: rocking }] : []),
    ...(short.length > 0 ? [{ what: 'backing' as const, units: short }] : []),
    ...(hasScribes ? [{ what: 'scribe-tools' as const }] : []),
    { what: 'fixings' },
    { what: 'finder' },
    { what: 'level' },
    { what: 'protection' },
  ];
}

const sum = (values: number[]): number => values.reduce((total, value) => total + value, 0);
