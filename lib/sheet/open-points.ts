import type { Fit } from '@/lib/measure/fit';
import type { MissingReading } from '@/lib/measure/missing-reading';

/**
 * What speaks against releasing a fit, in words; with any, the releaser must say why it goes out all the
 * same.
 *
 * Edge: a reading that was skipped with a reason is still missing; "close" and "loose" speak against
 * nothing, they stand on the sheet.
 */
export function openPoints(fit: Fit, missing: readonly MissingReading[]): string[] {
  return [
    ...missing.filter(({ need }) => need === 'must').map(({ words }) => `Not read: ${words}`),
    ...(fit.closure.suspect ? [fit.closure.suspect.words] : []),
    ...fit.runs.flatMap((run) =>
      run.fill?.verdict === 'short' ? [`${run.name} is short: ${run.fill.words}`] : [],
    ),
    ...fit.verdicts.filter(({ verdict }) => verdict === 'over').map(({ words }) => words),
    ...fit.problems.filter(({ severity }) => severity === 'error').map(({ message }) => message),
  ];
}
