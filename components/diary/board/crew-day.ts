import type { WorkedHours } from '@/lib/schedule/working-pattern';
import type { LocalDate } from '@/lib/time/civil';
import { fromLocal } from '@/lib/time/local-moment';
import type { Zone } from '@/lib/time/zones';

export type CrewDay = {
  isWorked: boolean;
  /** Of the hours worked that day. */
  freeMinutes: number;
  workedMinutes: number;
  /** Taken stretches as parts of the day worked: 0 its start, 1 its end. */
  taken: { from: number; until: number; isElsewhere: boolean }[];
  /** The crews that somebody of this one is out with. */
  with: string[];
};

type Stretch = {
  startsAt: string;
  endsAt: string;
  /** The other crew that somebody is out with then; empty for a visit of its own. */
  with: string;
};

/** How much of a crew's day is taken. What lies outside the hours takes nothing of them. */
export function crewDay(
  date: LocalDate,
  pieces: readonly Stretch[],
  hours: WorkedHours | null,
  zone: Zone,
): CrewDay {
  if (!hours) return { isWorked: false, freeMinutes: 0, workedMinutes: 0, taken: [], with: [] };
  const opensMs = fromLocal(date, hours.start, zone).getTime();
  const closesMs = fromLocal(date, hours.end, zone).getTime();
  const within = pieces
    .map((piece) => ({
      with: piece.with,
      fromMs: Math.max(opensMs, Date.parse(piece.startsAt)),
      untilMs: Math.min(closesMs, Date.parse(piece.endsAt)),
    }))
    .filter(({ fromMs, untilMs }) => untilMs > fromMs)
    .sort((a, b) => a.fromMs - b.fromMs);
  const dayMs = closesMs - opensMs;
  return {
    isWorked: true,
    workedMinutes: dayMs / 60_000,
    freeMinutes: Math.round((dayMs - coveredMs(within)) / 60_000),
    taken: within.map((piece) => ({
      from: (piece.fromMs - opensMs) / dayMs,
      until: (piece.untilMs - opensMs) / dayMs,
      isElsewhere: piece.with !== '',
    })),
    with: [...new Set(within.map((piece) => piece.with).filter(Boolean))],
  };
}

/** One crew's own pieces never overlap, but two of its people may be out with others at the same time. */
function coveredMs(inOrder: readonly { fromMs: number; untilMs: number }[]): number {
  let sum = 0;
  let reachedMs = Number.NEGATIVE_INFINITY;
  for (const { fromMs, untilMs } of inOrder) {
    sum += Math.max(0, untilMs - Math.max(fromMs, reachedMs));
    reachedMs = Math.max(reachedMs, untilMs);
  }
  return sum;
}
