import { crewColour } from '@/components/diary/crew-colour';
import { Button } from '@/components/ui/button';
import { TitleBlock } from '@/components/ui/title-block';
import type { CrewDay } from '@/lib/contracts/day-plans';
import type { StopMove } from './plan-moves';
import { StopLine } from './stop-line';

type CrewDayListProps = {
  crew: CrewDay;
  moves: ReadonlyMap<string, StopMove>;
  isEstimated: boolean;
  lookedAt: string | null;
  onLook: (visitId: string) => void;
  /** Looks for a better order of this crew's own stops; null where there is nothing to order. */
  onBetter: (() => void) | null;
};

/** One crew's day from the base to the base. */
export function CrewDayList({ crew, moves, isEstimated, lookedAt, ...rest }: CrewDayListProps) {
  return (
    <section
      aria-label={crew.crewName}
      className="pb-5"
      style={{ '--crew': crewColour(crew.colour) } as React.CSSProperties}
    >
      <TitleBlock
        title={<span className="border-l-4 border-[var(--crew)] pl-2">{crew.crewName}</span>}
        meta={
          <span className="flex items-baseline gap-3">
            {crew.stops.length > 0
              ? `${Math.round(crew.driveMinutes)} min drive${isEstimated ? ', estimated' : ''}`
              : ''}
            {rest.onBetter ? (
              <Button
                look="plain"
                onClick={rest.onBetter}
                aria-label={`Better order for ${crew.crewName}`}
                className="-my-2 px-1"
              >
                Better order
              </Button>
            ) : null}
          </span>
        }
      />
      {crew.troubles.map((trouble) => (
        <p key={trouble} className="border-l-4 border-chalk px-3 py-1 font-medium text-chalk">
          {trouble}
        </p>
      ))}
      {crew.stops.length === 0 ? (
        <p className="py-2 text-graphite">Nothing booked.</p>
      ) : (
        <>
          <ol>
            {crew.stops.map((stop, index) => (
              <StopLine
                key={stop.visitId}
                stop={stop}
                number={index + 1}
                move={moves.get(stop.visitId)}
                isLookedAt={stop.visitId === lookedAt}
                onLook={() => rest.onLook(stop.visitId)}
              />
            ))}
          </ol>
          <p className="ml-3 border-l border-dashed border-graphite py-1 pl-3 text-note text-graphite">
            {Math.round(crew.driveHomeMinutes)} min home
          </p>
        </>
      )}
    </section>
  );
}
