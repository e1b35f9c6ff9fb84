import { crewColour } from '@/components/diary/crew-colour';
import { useDiaryLocale } from '@/components/diary/diary-locale';
import { KindMark } from '@/components/diary/kind-mark';
import { isOpen } from '@/components/diary/place';
import { minutesWords, statusWords } from '@/components/diary/visit-words';
import { Verdict } from '@/components/ui/verdict';
import type { CrewView, VisitView } from '@/lib/contracts/visits';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { formatTime } from '@/lib/time/format-instant';
import type { Zone } from '@/lib/time/zones';

/** One visit in a line: opened by its name, rung by its number. */
export function VisitRow({
  visit,
  dayNumber,
  crew,
  zone,
  onOpen,
}: {
  visit: VisitView;
  /** Of a visit of several days, which of them this is; 1 for the first. */
  dayNumber: number;
  crew: CrewView | undefined;
  zone: Zone;
  onOpen: (visit: VisitView) => void;
}) {
  const locale = useDiaryLocale();
  const { words, verdict } = statusWords[visit.status];
  const piece = visit.pieces[dayNumber - 1];
  const days = visit.pieces.length;
  return (
    <li
      className="visit-row"
      data-open={isOpen(visit) || undefined}
      style={{ '--crew': crew ? crewColour(crew.colour) : undefined } as React.CSSProperties}
    >
      <span className="visit-row-when">
        <b>{piece ? formatTime(new Date(piece.startsAt), zone, locale) : ''}</b>{' '}
        <span className="text-note text-graphite">
          {days > 1 ? `day ${dayNumber} of ${days}` : minutesWords(visit.workMinutes)}
        </span>
      </span>
      <button
        type="button"
        className="visit-row-who"
        data-visit-id={visit.id}
        onClick={() => onOpen(visit)}
      >
        <KindMark kind={visit.kind} isNamed /> <b>{visit.customerName}</b>
        <span className="text-graphite">
          , {visit.street}
          {visit.town ? `, ${visit.town}` : ''} · {visitKindWords[visit.kind].toLowerCase()}
        </span>
        {visit.customerSays ? (
          <span className="block text-note text-ochre">“{visit.customerSays}”</span>
        ) : null}
      </button>
      <span className="visit-row-crew">{visit.crewName}</span>
      <Verdict kind={verdict}>{words}</Verdict>
      {visit.phone ? (
        <a
          href={`tel:${visit.phone.replace(/[^+\d]/g, '')}`}
          className="visit-row-phone"
          aria-label={`Ring ${visit.customerName}, ${visit.phone}`}
        >
          {visit.phone}
        </a>
      ) : (
        <span className="visit-row-phone text-graphite">no phone</span>
      )}
    </li>
  );
}
