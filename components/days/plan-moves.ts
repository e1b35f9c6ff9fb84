import type { CrewDay, DayChange, DayPlanView, PlannedStop } from '@/lib/contracts/day-plans';

/** What the better order does to one stop. */
export type StopMove = {
  wasTimeWords: string;
  /** Empty where the crew stays the same. */
  wasCrewName: string;
};

type Placed = { stop: PlannedStop; crew: CrewDay };

/** By visit, what changes from the day as it stands to the better one. */
export function movesOfPlan({ now, better, changes }: DayPlanView): Map<string, StopMove> {
  const before = placedByVisit(now);
  const after = placedByVisit(better);
  const moves = new Map<string, StopMove>();
  for (const { visitId } of changes) {
    const was = before.get(visitId);
    const is = after.get(visitId);
    if (!was || !is) continue;
    moves.set(visitId, {
      wasTimeWords: was.stop.timeWords,
      wasCrewName: was.crew.crewId === is.crew.crewId ? '' : was.crew.crewName,
    });
  }
  return moves;
}

/** What puts the day back as it was before the plan was taken; taking it has raised each version by one. */
export function changesBack({ now, changes }: DayPlanView): DayChange[] {
  const before = placedByVisit(now);
  return changes.flatMap(({ visitId, version }) => {
    const was = before.get(visitId);
    if (!was) return [];
    const { crew, stop } = was;
    return [{ visitId, version: version + 1, crewId: crew.crewId, startsAt: stop.startsAt }];
  });
}

function placedByVisit(crews: readonly CrewDay[]): Map<string, Placed> {
  return new Map(
    crews.flatMap((crew) => crew.stops.map((stop) => [stop.visitId, { stop, crew }] as const)),
  );
}

/** "45 min less", "the same"; minutes of driving are for people rounded. */
export function savedWords(nowMinutes: number, betterMinutes: number): string {
  const saved = Math.round(nowMinutes) - Math.round(betterMinutes);
  if (saved === 0) return 'the same drive';
  return saved > 0 ? `${saved} min less` : `${-saved} min more`;
}
