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

/**
 * The crews that are as many as a visit needs and take nobody for nothing: a measure by two takes no less time than
 * by one, so a crew of two is left out where a crew of some of its people can go. Fitters are quicker by more.
 * Example: of Tor, Ana and the pair of both, one person needed leaves Tor and Ana, two leave the pair.
 * Common practice.
 */
export function crewsOfEnough<
  Crew extends { does: 'measure' | 'fit'; people: readonly { id: string }[] },
>(crews: readonly Crew[], peopleNeeded: number): Crew[] {
  const enough = crews.filter(({ people }) => people.length >= peopleNeeded);
  return enough.filter(
    (crew) => crew.does === 'fit' || !enough.some((other) => isPartOf(other.people, crew.people)),
  );
}

function isPartOf(some: readonly { id: string }[], all: readonly { id: string }[]): boolean {
  return some.length < all.length && some.every(({ id }) => all.some((one) => one.id === id));
}
