import type { Fit } from '@/lib/measure/fit';

/**
 * What no reason lifts: the sheet does not go out until it is put right on the wall.
 *
 * Edge: a rule set without a second level for the pieces stops nothing. Example: pieces 8 mm less than the whole in a
 * shop that refuses from 6: "Wall B, pieces against the whole at the counter: 8 mm; …".
 * Source: the shop's rule "pieces against the whole".
 */
export function releaseStops({ verdicts }: Pick<Fit, 'verdicts'>): string[] {
  return verdicts
    .filter(({ check, serious }) => check === 'pieces-against-whole' && serious)
    .map(({ words, action }) => `${words} ${action}`);
}
