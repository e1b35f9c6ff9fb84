import { useDiaryLocale } from '@/components/diary/diary-locale';
import { formatLocalDay } from '@/lib/time/format-civil';
import type { BoardDay } from './board-days';
import { weekdayShort } from './day-head-words';

/** The days across the top; each opens that day. */
export function BoardHead({
  days,
  today,
  onDay,
}: {
  days: readonly BoardDay[];
  today: string;
  onDay: (date: string) => void;
}) {
  const locale = useDiaryLocale();
  return (
    <div className="board-line board-head">
      <span className="board-name" />
      {days.map((day) => (
        <button
          key={day.date}
          type="button"
          className="board-day-name"
          data-today={day.date === today || undefined}
          data-week-start={day.isWeekStart || undefined}
          aria-label={`Open ${formatLocalDay(day.date, locale)}`}
          onClick={() => onDay(day.date)}
        >
          <b>
            <span className="board-weekday">{weekdayShort(day.date)}</span>{' '}
            {Number(day.date.slice(8))}
          </b>
          {day.date === today ? <em>today</em> : null}
          {day.isWorked ? null : <em>closed</em>}
        </button>
      ))}
    </div>
  );
}
