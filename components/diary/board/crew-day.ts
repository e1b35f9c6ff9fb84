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
  taken: { from: number; until: number }[];
};

type Stretch = { startsAt: string; endsAt: string };

/** How much of a crew's day is taken. What lies outside the hours takes nothing of them. */
export function crewDay(
  date: LocalDate,
  pieces: readonly Stretch[],
  hours: WorkedHours | null,
  zone: Zone,
): CrewDay {
  if (!hours) return { isWorked: false, freeMinutes: 0, workedMinutes: 0, taken: [] };
  const opensMs = fromLocal(date, hours.start, zone).getTime();
  const closesMs = fromLocal(date, hours.end, zone).getTime();
  const within = pieces
    .map(({ startsAt, endsAt }) => ({
      fromMs: Math.max(opensMs, Date.parse(startsAt)),
      untilMs: Math.min(closesMs, Date.parse(endsAt)),
    }))
    .filter(({ fromMs, untilMs }) => untilMs > fromMs)
    .sort((a, b) => a.fromMs - b.fromMs);
  const takenMs = within.reduce((sum, { fromMs, untilMs }) => sum + untilMs - fromMs, 0);
  const dayMs = closesMs - opensMs;
  return {
    isWorked: true,
    workedMinutes: dayMs / 60_000,
    // Pieces of one crew never overlap: the database refuses it.
    freeMinutes: Math.round((dayMs - takenMs) / 60_000),
    taken: within.map(({ fromMs, untilMs }) => ({
      from: (fromMs - opensMs) / dayMs,
      until: (untilMs - opensMs) / dayMs,
    })),
  };
}
