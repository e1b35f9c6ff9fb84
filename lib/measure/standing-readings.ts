import type { Reading } from '@/lib/contracts/readings';

/** What decides whether a reading stands: its id, what it corrects, what it takes back. */
export type BookLine = { id: string; kind: string; replaces?: string; readingId?: string };

/**
 * The readings that stand, in the order given: not taken back, and not corrected.
 *
 * Edge: a withdrawal may be withdrawn, and a correction that is withdrawn gives its target back, unless a
 * later correction of it stands; the order in which the lines arrive does not matter. Lines that correct
 * each other in a ring all stand, so that none is lost. Withdrawals and skips are not readings of the room and are left out.
 * Example: A, then B that replaces A, then a withdrawal of B: A stands.
 * Problems: none; a target that is not in the book changes nothing. Source: the wall book's own rule.
 */
export function standingReadings<Line extends BookLine>(lines: readonly Line[]): Line[] {
  const fallen = fallenIds(lines);
  return lines.filter(
    (line) => !fallen.has(line.id) && line.kind !== 'withdrawal' && line.kind !== 'skip',
  );
}

/** As `standingReadings`, the ids alone. */
export function standingIds(readings: readonly Reading[]): string[] {
  return standingReadings(readings).map(({ id }) => id);
}

function fallenIds(lines: readonly BookLine[]): Set<string> {
  const takenBack = settle(
    lines,
    ({ kind, readingId }) => (kind === 'withdrawal' ? readingId : undefined),
    (_withdrawal, isStruck) => !isStruck,
  );
  const corrected = settle(
    lines,
    ({ replaces }) => replaces,
    (correction, isStruck) => isStruck || !takenBack.has(correction.id),
  );
  return new Set([...takenBack, ...corrected]);
}

/**
 * The targets that are struck. A line strikes by what it is and by whether it is struck itself, so lines
 * are settled from those that nothing strikes; a ring is never reached.
 */
function settle(
  lines: readonly BookLine[],
  targetOf: (line: BookLine) => string | undefined,
  strikes: (line: BookLine, isStruck: boolean) => boolean,
): Set<string> {
  const open = new Map<string, number>();
  const byId = new Map(lines.map((line) => [line.id, line]));
  for (const line of lines) {
    const target = targetOf(line);
    if (target !== undefined) open.set(target, (open.get(target) ?? 0) + 1);
  }
  const struck = new Set<string>();
  const ready = lines.filter(({ id }) => !open.has(id));
  for (let line = ready.pop(); line; line = ready.pop()) {
    const target = targetOf(line);
    if (target === undefined) continue;
    if (strikes(line, struck.has(line.id))) struck.add(target);
    const left = (open.get(target) ?? 0) - 1;
    open.set(target, left);
    const next = left === 0 ? byId.get(target) : undefined;
    if (next) ready.push(next);
  }
  return struck;
}
