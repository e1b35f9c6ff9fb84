import Link from 'next/link';
import { crewColour } from '@/components/diary/crew-colour';
import type { Elsewhere, HoursOf } from '@/components/diary/crew-hours-query';
import type { CrewView, VisitView } from '@/lib/contracts/visits';
import { paths } from '@/lib/paths';
import { localDate } from '@/lib/time/local-moment';
import type { Zone } from '@/lib/time/zones';
import { BoardBarButton } from './board-bar-button';
import { boardBars } from './board-bars';
import type { BoardDay } from './board-days';
import { crewDay } from './crew-day';
import { CrewDayCell } from './crew-day-cell';

type BoardRowProps = {
  crew: CrewView;
  days: readonly BoardDay[];
  zone: Zone;
  hoursOf: HoursOf;
  elsewhere: readonly Elsewhere[];
  today: string;
  weeks: number;
  visits: readonly VisitView[];
  ghostId: string | null;
  mayMove: boolean;
  onOpen: (visit: VisitView) => void;
};

/** One crew: its days with what is free of each, and its visits as bars under them. */
export function BoardRow(props: BoardRowProps) {
  const { crew, days, zone, hoursOf, visits, ...rest } = props;
  const bars = boardBars(visits, days, zone);
  const lanes = Math.max(1, ...bars.map(({ lane }) => lane + 1));
  const pieces = visits
    .filter(({ id }) => id !== rest.ghostId)
    .flatMap((visit) => visit.pieces)
    .map(({ startsAt, endsAt }) => ({ startsAt, endsAt, with: '' }));
  const elsewhere = rest.elsewhere.map(({ crewName, ...piece }) => ({ ...piece, with: crewName }));
  const taken = [...pieces, ...elsewhere].map((piece) => ({
    ...piece,
    date: localDate(new Date(piece.startsAt), zone),
  }));
  return (
    <section
      aria-label={crew.name}
      className="board-line board-row"
      style={{ '--lanes': lanes, '--crew': crewColour(crew.colour) } as React.CSSProperties}
    >
      <h2 className="board-name">
        <Link href={paths.crews()} className="hover:underline">
          {crew.name}
        </Link>
        <span>{crew.people.map(({ name }) => name.split(' ')[0]).join(', ')}</span>
      </h2>
      {days.map((day, column) => (
        <CrewDayCell
          key={day.date}
          day={day}
          column={column}
          crewId={crew.id}
          isToday={day.date === rest.today}
          crewDay={crewDay(
            day.date,
            taken.filter(({ date }) => date === day.date),
            hoursOf(crew.id, day.date),
            zone,
          )}
        />
      ))}
      {bars.map((bar) => (
        <BoardBarButton
          key={bar.visit.id}
          bar={bar}
          zone={zone}
          isGhost={bar.visit.id === rest.ghostId}
          isShort={rest.weeks > 2}
          mayMove={rest.mayMove}
          onOpen={rest.onOpen}
        />
      ))}
    </section>
  );
}
