const hourMs = 3_600_000;
const dayMs = 24 * hourMs;

/**
 * Which copies stay: all of the last 24 hours, the last of each day for 14 days, the last of each week for
 * 8 weeks, and always the newest. Days and weeks are counted in UTC from the epoch, so that the same copies
 * stay whenever it is asked. Common practice (grandfather, father, son).
 *
 * @param takenAt when each copy was taken, in any order
 * @param now nothing newer than this is judged: a clock that was set back loses no copy
 */
export function backUpsToKeep(takenAt: readonly Date[], now: Date): Date[] {
  const newestFirst = [...takenAt].sort((a, b) => b.getTime() - a.getTime());
  const isLastOfDay = firstOfEach(dayMs);
  const isLastOfWeek = firstOfEach(7 * dayMs);
  return newestFirst.filter((taken, place) => {
    const age = now.getTime() - taken.getTime();
    const [lastOfDay, lastOfWeek] = [isLastOfDay(taken), isLastOfWeek(taken)];
    return (
      place === 0 ||
      age <= dayMs ||
      (age <= 14 * dayMs && lastOfDay) ||
      (age <= 56 * dayMs && lastOfWeek)
    );
  });
}

/** Asked newest first: whether this is the first of its span, and so the last that was taken in it. */
function firstOfEach(spanMs: number): (taken: Date) => boolean {
  const seen = new Set<number>();
  return (taken) => {
    const span = Math.floor(taken.getTime() / spanMs);
    const isFirst = !seen.has(span);
    seen.add(span);
    return isFirst;
  };
}
