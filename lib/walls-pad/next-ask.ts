import type { PlannedReading } from '@/lib/measure/missing-reading';

/** Neither taken nor skipped. */
export function isOpen({ takenBy, skipped }: PlannedReading): boolean {
  return takenBy.length === 0 && skipped === null;
}

/**
 * The question to offer next: the first open one after a slot in walking order, round to the start; null
 * when nothing is open.
 *
 * Edge: the slot itself is not offered again while others are open; one that is not in the plan, or none,
 * begins at the start.
 * Example: A, B, C with B just answered: C. With C just answered and A skipped over: A.
 */
export function nextAsk(
  plan: readonly PlannedReading[],
  afterSlot: string | null,
): PlannedReading | null {
  const at = plan.findIndex(({ slot }) => slot === afterSlot);
  return [...plan.slice(at + 1), ...plan.slice(0, at + 1)].find(isOpen) ?? null;
}

/** The slot before another in walking order, so that what takes its place is asked next; null at the start. */
export function slotBefore(plan: readonly PlannedReading[], slot: string | null): string | null {
  return plan[plan.findIndex((planned) => planned.slot === slot) - 1]?.slot ?? null;
}

/** "5 of 23 to go"; must and should count alike, skipped ones are done with. */
export function toGoWords(plan: readonly PlannedReading[]): string {
  const open = plan.filter(isOpen).length;
  return open === 0 ? 'all read' : `${open} of ${plan.length} to go`;
}
