import { useDiaryLocale } from '@/components/diary/diary-locale';
import { KindMark } from '@/components/diary/kind-mark';
import { canChange, isOpen } from '@/components/diary/place';
import { minutesWords, statusWords } from '@/components/diary/visit-words';
import { Glyph } from '@/components/ui/glyph';
import type { VisitView } from '@/lib/contracts/visits';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { formatTime } from '@/lib/time/format-instant';
import type { Zone } from '@/lib/time/zones';
import { barName } from './bar-name';
import type { BoardBar } from './board-bars';

/**
 * A visit on the board. Its right edge stretches it; keys do both as well. How much it says goes by its own
 * width (crew-board.css): the whole, the name and the time, or the last name under the two glyphs. The name is
 * what is looked for, so it gives way last.
 */
export function BoardBarButton({
  bar,
  zone,
  isGhost,
  isShort,
  mayMove,
  onOpen,
}: {
  bar: BoardBar;
  zone: Zone;
  isGhost: boolean;
  isShort: boolean;
  mayMove: boolean;
  onOpen: (visit: VisitView) => void;
}) {
  const { visit, firstColumn, lastColumn, lane, restColumns } = bar;
  const { words, verdict } = statusWords[visit.status];
  const time = formatTime(new Date(visit.startsAt), zone, useDiaryLocale());
  const isMovable = mayMove && canChange(visit) && !isGhost;
  const columns = lastColumn - firstColumn + 1;
  const { first, last } = barName(visit.customerName);
  return (
    <button
      type="button"
      className="board-bar"
      style={{ gridColumn: `${firstColumn + 2} / ${lastColumn + 3}`, gridRow: lane + 2 }}
      data-visit-id={isGhost ? undefined : visit.id}
      data-movable={isMovable || undefined}
      data-short={isShort || undefined}
      data-open={isOpen(visit) || undefined}
      data-ghost={isGhost || undefined}
      data-cut-before={bar.isCutBefore || undefined}
      data-cut-after={bar.isCutAfter || undefined}
      aria-label={`${visitKindWords[visit.kind]}: ${visit.customerName}, ${visit.street}, ${visit.dayWords} ${time}, ${minutesWords(visit.workMinutes)}, ${visit.crewName}, ${words}`}
      onClick={isGhost ? undefined : () => onOpen(visit)}
    >
      {restColumns.map((column) => (
        <span
          key={column}
          aria-hidden="true"
          className="board-rest"
          style={{
            left: `${((column - firstColumn) / columns) * 100}%`,
            width: `${100 / columns}%`,
          }}
        />
      ))}
      <span className="board-bar-line board-who">
        <KindMark kind={visit.kind} isNamed />{' '}
        {isGhost ? null : <Glyph name={verdict} className="board-status" />}
        <b>
          <span className="board-first">{first} </span>
          {last}
        </b>
        <span className="board-more">, {visit.street}</span>{' '}
        <span className="board-time">{time}</span>
      </span>
      {isShort ? null : (
        <span className="board-bar-line board-detail">
          {time}
          <span className="board-length">
            {' · '}
            {isGhost ? 'would be here' : minutesWords(visit.workMinutes)}
          </span>
          <span className="board-more"> · {visit.jobTitle}</span>
        </span>
      )}
      {visit.customerSays && !isShort ? (
        <span className="board-bar-line board-says">“{visit.customerSays}”</span>
      ) : null}
      <span className="board-print">
        {visit.windowWords} · {words}
        {visit.phone ? ` · ${visit.phone}` : ''}
      </span>
      {isMovable && !bar.isCutAfter ? <span className="board-stretch" aria-hidden="true" /> : null}
    </button>
  );
}
