import { ClosureFigure } from '@/components/drawing/closure-figure';
import { TitleBlock } from '@/components/ui/title-block';
import { Verdict } from '@/components/ui/verdict';
import type { WallBookView } from '@/lib/contracts/rooms';
import { drawClosure } from '@/lib/drawing/closure-picture';
import { closureSays, suspectAdvice } from '@/lib/drawing/closure-words';
import type { PlannedReading } from '@/lib/measure/missing-reading';
import type { ProvedRoom } from '@/lib/measure/prove-room';
import { readingWords } from '@/lib/walls-pad/reading-words';
import { type BookPlace, placeHref } from './book-place';
import { FractionWords } from './fraction-words';
import { LineLink } from './line-link';
import { questionOfDiagonal } from './pad-question';

type RoomProofProps = { fit: ProvedRoom; view: WallBookView; plan: PlannedReading[] };

/** Whether the readings hold together; if not, which one is likely wrong, and what would settle it. */
export function RoomProof({ fit, view, plan }: RoomProofProps) {
  const { suspect, words, settle, adjustment } = fit.closure;
  const drawing = drawClosure({ wallBook: view.wallBook, fit, rules: view.rules });
  const disagreeing = fit.problems.filter(({ code }) => code === 'repeats-disagree');
  const known = new Set(plan.map(({ slot }) => slot));
  const { room } = view.wallBook;
  const canAsk = (slot: string) => known.has(slot) || questionOfDiagonal(slot, room) !== null;
  const named = new Set((suspect?.readings ?? []).flatMap(({ readingIds }) => readingIds));
  const steps = settle.flatMap((step) => {
    // The suspect itself is offered above already.
    if (named.has(step.slot.replace('again:', ''))) return [];
    const place = placeOfSlot(step.slot, canAsk);
    return place ? [{ ...step, place }] : [];
  });
  const isProved = adjustment?.observations.every(({ smallestSlip }) => smallestSlip !== null);
  const kind = suspect || disagreeing.length > 0 ? 'problem' : isProved ? 'within' : 'waiting';
  const word = { problem: 'look again', within: 'holds together', waiting: 'not proved yet' }[kind];
  return (
    <section>
      <TitleBlock title="Does it hold together?" meta={<Verdict kind={kind}>{word}</Verdict>} />
      <p className="py-2">
        <FractionWords>{suspectAdvice(fit, room, view.rules) ?? words}</FractionWords>
      </p>
      {drawing ? <ClosureFigure drawing={drawing} title="Does the room close?" /> : null}
      {drawing ? (
        <details>
          <summary className="min-h-11 py-2.5 text-note">What the picture says</summary>
          {closureSays(fit, drawing, view.rules).map((line) => (
            <p key={line} className="pb-2 text-note">
              <FractionWords>{line}</FractionWords>
            </p>
          ))}
        </details>
      ) : null}
      <ul className="divide-y divide-rule">
        {(suspect?.readings ?? []).flatMap(({ readingIds, words: named }) =>
          readingIds.slice(0, 1).map((readingId) => (
            <li key={readingId}>
              <LineLink href={placeHref({ at: 'again', readingId })} value="again">
                <FractionWords>{named}</FractionWords>
              </LineLink>
            </li>
          )),
        )}
        {disagreeing.map(({ about, message }) => (
          <li key={about.join()}>
            <LineLink
              href={placeHref({ at: 'again', readingId: about[0] ?? '' })}
              note={message}
              value="again"
            >
              <FractionWords>{bothReadings(about, view)}</FractionWords>
            </LineLink>
          </li>
        ))}
        {steps.slice(0, 2).map(({ slot, words: step, place }) => (
          <li key={slot}>
            <LineLink
              href={placeHref(place)}
              note="would settle most, cheapest first"
              value="take it"
            >
              <FractionWords>{step}</FractionWords>
            </LineLink>
          </li>
        ))}
      </ul>
    </section>
  );
}

/** A settling step is a reading planned, a diagonal besides, or one taken before, again. */
function placeOfSlot(slot: string, canAsk: (slot: string) => boolean): BookPlace | null {
  if (slot.startsWith('again:')) return { at: 'again', readingId: slot.slice('again:'.length) };
  return canAsk(slot) ? { at: 'ask', slot } : null;
}

function bothReadings(ids: string[], view: WallBookView): string {
  const { room, readings } = view.wallBook;
  const named = ids.flatMap((id) => {
    const reading = readings.find((each) => each.id === id);
    const by = view.readers.find(({ readingIds }) => readingIds.includes(id))?.name;
    return reading ? [{ ...readingWords(reading, room, view.rules), by }] : [];
  });
  // Names tell two people's readings apart, and say nothing where one took both.
  const isOfTwo = new Set(named.map(({ by }) => by)).size > 1;
  return `${named[0]?.what ?? 'Two readings'}: ${named
    .map(({ value, by }) => (isOfTwo ? `${value} (${by ?? 'you'})` : value))
    .join(' and ')}`;
}
