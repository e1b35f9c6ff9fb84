import type { VisitKind } from './visit-kind';
import { doesKind } from './visit-kind-words';

/**
 * Whether a crew goes out for a kind of visit: by the kinds that it names, or where it names none, by what
 * it does. Example: a crew that fits and names installs alone makes no deliveries.
 */
export function goesOutFor(
  crew: { does: 'measure' | 'fit'; kinds: readonly VisitKind[] },
  kind: VisitKind,
): boolean {
  return crew.kinds.length > 0 ? crew.kinds.includes(kind) : doesKind[kind] === crew.does;
}
