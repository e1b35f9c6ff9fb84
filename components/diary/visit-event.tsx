import { Verdict } from '@/components/ui/verdict';
import type { EventDetail } from './diary-events';
import { KindMark } from './kind-mark';
import { statusWords } from './visit-words';

const partOf = ({ visit, pieceNumber }: EventDetail): string =>
  visit.pieces.length > 1 ? `${pieceNumber} of ${visit.pieces.length}` : '';

/** A visit in the month: what and whom in a line. The calendar colours no edge there, so the line has the crew's. */
export function VisitLine({ detail, colour }: { detail: EventDetail; colour: string }) {
  const { visit } = detail;
  return (
    <div className="visit-line" style={{ borderLeftColor: colour }}>
      <KindMark kind={visit.kind} />
      <span className="truncate">
        {visit.customerName} {partOf(detail)}
      </span>
    </div>
  );
}

/** A visit as it stands in the diary: whom, where, what, and whether they said yes. */
export function VisitEvent({ detail }: { detail: EventDetail }) {
  const { visit, pieceNumber, isGhost } = detail;
  const { words, verdict } = statusWords[visit.status];
  const part = partOf(detail);
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
