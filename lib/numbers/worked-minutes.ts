import type { Span } from './facts';

/**
 * Minutes at work on site: from arriving to leaving, without pauses and without the nights between the daily
 * pieces of a visit. Null until the crew has left.
 */
export function workedMinutes(visit: {
  arrivedAt: Date | null;
  leftAt: Date | null;
  pieces: readonly Span[];
  pauses: readonly Span[];
}): number | null {
  const { arrivedAt, leftAt } = visit;
  if (!arrivedAt || !leftAt || leftAt <= arrivedAt) return null;
  const away = [...visit.pauses, ...nightsBetween(visit.pieces)]
    .map(({ startsAt, endsAt }) => ({
      from: Math.max(startsAt.getTime(), arrivedAt.getTime()),
      to: Math.min(endsAt.getTime(), leftAt.getTime()),
    }))
    .filter(({ from, to }) => to > from)
    .sort((a, b) => a.from - b.from);
  let awayMs = 0;
  let until = 0;
  for (const { from, to } of away) {
    awayMs += Math.max(0, to - Math.max(from, until));
    until = Math.max(until, to);
  }
  return (leftAt.getTime() - arrivedAt.getTime() - awayMs) / 60_000;
}

function nightsBetween(pieces: readonly Span[]): Span[] {
  const inOrder = [...pieces].sort((a, b) => a.startsAt.getTime() - b.startsAt.getTime());
  return inOrder.slice(1).map((piece, place) => ({
    startsAt: inOrder[place]?.endsAt ?? piece.startsAt,
    endsAt: piece.startsAt,
  }));
}
