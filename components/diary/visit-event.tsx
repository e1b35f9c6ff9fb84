import { Verdict } from '@/components/ui/verdict';
import type { EventDetail } from './diary-events';
import { KindMark } from './kind-mark';
import { statusWords } from './visit-words';

/** A visit as it stands in the diary: whom, where, what, and whether they said yes. */
export function VisitEvent({
  detail: { visit, pieceNumber, isGhost },
  isCompact,
}: {
  detail: EventDetail;
  isCompact: boolean;
}) {
  const { words, verdict } = statusWords[visit.status];
  const part = visit.pieces.length > 1 ? `${pieceNumber} of ${visit.pieces.length}` : '';
  if (isCompact) {
    return (
      <div className="visit-line">
        <KindMark kind={visit.kind} />
        <span className="truncate">
          {visit.customerName} {part}
        </span>
      </div>
    );
  }
  return (
    <div className="visit-box">
      <span className="visit-mark">
        <KindMark kind={visit.kind} /> {part}
      </span>
      <b>
        {visit.customerName}
        <span className="visit-street">, {visit.street}</span>
      </b>
      <em>{visit.jobTitle}</em>
      {pieceNumber === 1 ? (
        <>
          <em>in: {visit.windowWords}</em>
          <span className="visit-status">
            {isGhost ? 'would be here' : <Verdict kind={verdict}>{words}</Verdict>}
          </span>
          {visit.customerSays ? <em className="text-ochre">“{visit.customerSays}”</em> : null}
        </>
      ) : null}
    </div>
  );
}
