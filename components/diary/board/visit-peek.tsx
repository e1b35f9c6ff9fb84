import { KindMark } from '@/components/diary/kind-mark';
import { minutesWords, statusWords } from '@/components/diary/visit-words';
import { Verdict } from '@/components/ui/verdict';
import type { VisitView } from '@/lib/contracts/visits';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';

const widthPx = 288;
/** As high as it gets with a wish of two lines; it must not hang over the edge. */
const mostHeightPx = 220;

/** All of a visit beside its bar, for the eye: whoever listens has the bar's own words. */
export function VisitPeek({ visit, bar }: { visit: VisitView; bar: DOMRect }) {
  const { words, verdict } = statusWords[visit.status];
  const isAbove = bar.bottom + mostHeightPx > window.innerHeight && bar.top > mostHeightPx;
  const left = Math.max(8, Math.min(bar.left, window.innerWidth - widthPx - 8));
  return (
    <div
      aria-hidden="true"
      data-peek
      className="fixed z-30 flex flex-col rounded border border-ink bg-sheet px-3 py-2 text-note print:hidden"
      style={{
        width: widthPx,
        left,
        ...(isAbove ? { bottom: window.innerHeight - bar.top } : { top: bar.bottom }),
      }}
    >
      <p className="flex items-baseline justify-between gap-2 border-b border-rule pb-1">
        <span>
          <KindMark kind={visit.kind} isNamed /> {visitKindWords[visit.kind]}
        </span>
        <Verdict kind={verdict}>{words}</Verdict>
      </p>
      <p className="pt-1 text-base font-bold">{visit.customerName}</p>
      <p>
        {visit.street}
        {visit.town ? `, ${visit.town}` : ''}
      </p>
      <p>
        {visit.dayWords}, {visit.windowWords}
      </p>
      <p className="text-graphite">
        {minutesWords(visit.workMinutes)}
        {visit.pieces.length > 1 ? ` over ${visit.pieces.length} days` : ''} · {visit.jobTitle}
        {visit.phone ? ` · ${visit.phone}` : ''}
      </p>
      {visit.customerSays ? <p className="text-ochre">“{visit.customerSays}”</p> : null}
    </div>
  );
}
