import type { PadEntry } from './pad-entry';
import type { PadVerdict } from './pad-verdict';

/** Long enough to see the verdict and to touch something else, short enough not to wait for. */
export const goOnAfterMs = 700;

/**
 * Whether the pad may go on by itself once a tick of the tape is touched: then an inch figure is whole, and
 * nothing more can be typed.
 *
 * Edge: it waits where the value is refused or over its rule, and where feet stand without inches.
 * Example: 95 and the tick 1/16, within the rule: yes. The same, over: no, the measurer looks first.
 */
export function mayGoOn(entry: PadEntry, says: PadVerdict['kind'] | 'refused' | 'why'): boolean {
  if (entry.unit !== 'in' || says === 'refused' || says === 'over') return false;
  return entry.feet === null || entry.whole !== '' || entry.sixtyFourths > 0;
}
