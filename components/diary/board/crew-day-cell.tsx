import { minutesWords } from '@/components/diary/visit-words';
import type { BoardDay } from './board-days';
import type { CrewDay } from './crew-day';
import { dayHeadWords } from './day-head-words';

/** What of a crew's day is taken, as a strip of its hours, and how much is free in words. */
export function CrewDayCell({
  day,
  column,
  crewId,
  isToday,
  crewDay,
}: {
  day: BoardDay;
  column: number;
  crewId: string;
  isToday: boolean;
  crewDay: CrewDay;
}) {
  const { isWorked, freeMinutes, workedMinutes, taken } = crewDay;
  const withOthers = crewDay.with.join(', ');
  return (
    <div
      className="board-cell"
      style={{ gridColumn: column + 2 }}
      data-board-date={day.date}
      data-board-crew={crewId}
      data-closed={!isWorked || undefined}
      data-today={isToday || undefined}
      data-week-start={day.isWeekStart || undefined}
    >
      {isWorked ? (
        <>
          <span className="board-hours" aria-hidden="true">
            {taken.map(({ from, until, isElsewhere }) => (
              <span
                key={`${from} ${isElsewhere}`}
                data-elsewhere={isElsewhere || undefined}
                style={{ left: `${from * 100}%`, width: `${(until - from) * 100}%` }}
              />
            ))}
          </span>
          <span className="board-free" title={withOthers ? `with ${withOthers}` : undefined}>
            <span className="sr-only">{dayHeadWords(day.date)}: </span>
            {freeMinutes === 0 ? (
              'full'
            ) : freeMinutes === workedMinutes ? (
              'free'
            ) : (
              <>
                {minutesWords(freeMinutes)}
                <span className="board-free-word"> free</span>
              </>
            )}
            {withOthers ? `, with ${withOthers}` : ''}
          </span>
        </>
      ) : (
        <span className="sr-only">{dayHeadWords(day.date)}: not worked</span>
      )}
    </div>
  );
}
