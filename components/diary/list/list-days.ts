import type { VisitView } from '@/lib/contracts/visits';
import type { LocalDate } from '@/lib/time/civil';
import { localDate } from '@/lib/time/local-moment';
import type { Zone } from '@/lib/time/zones';

export type ListDay = {
  date: LocalDate;
  /** In order of time; a visit of several days stands on each of them. */
  stands: { visit: VisitView; dayNumber: number }[];
};

/** The days of [from, to) on which somebody goes out, each with its visits. */
export function listDays(
  visits: readonly VisitView[],
  { from, to }: { from: LocalDate; to: LocalDate },
  zone: Zone,
): ListDay[] {
  const byDate = new Map<LocalDate, (ListDay['stands'][number] & { startsAt: string })[]>();
  for (const visit of visits) {
    for (const [index, { startsAt }] of visit.pieces.entries()) {
      const date = localDate(new Date(startsAt), zone);
      if (date < from || date >= to) continue;
      const stands = byDate.get(date) ?? [];
      stands.push({ visit, dayNumber: index + 1, startsAt });
      byDate.set(date, stands);
    }
  }
  return [...byDate]
    .sort(([a], [b]) => a.localeCompare(b))
    .map(([date, stands]) => ({
      date,
      stands: stands
        .sort(
          (a, b) => a.startsAt.localeCompare(b.startsAt) || a.visit.id.localeCompare(b.visit.id),
        )
        .map(({ visit, dayNumber }) => ({ visit, dayNumber })),
    }));
}
