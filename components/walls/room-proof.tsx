import { TitleBlock } from '@/components/ui/title-block';
import { Verdict } from '@/components/ui/verdict';
import type { WallBookView } from '@/lib/contracts/rooms';
import type { Fit } from '@/lib/measure/fit';
import type { PlannedReading } from '@/lib/measure/missing-reading';
import { readingWords } from '@/lib/walls-pad/reading-words';
import { type BookPlace, placeHref } from './book-place';
import { FractionWords } from './fraction-words';
import { LineLink } from './line-link';

type RoomProofProps = { fit: Fit; view: WallBookView; plan: PlannedReading[] };

/** Whether the readings hold together; if not, which one is likely wrong, and what would settle it. */
export function RoomProof({ fit, view, plan }: RoomProofProps) {
  const { suspect, words, settle, adjustment } = fit.closure;
  const disagreeing = fit.problems.filter(({ code }) => code === 'repeats-disagree');
  const known = new Set(plan.map(({ slot }) => slot));
  const steps = settle.flatMap((step) => {
    const place = placeOfSlot(step.slot, known);
    return place ? [{ ...step, place }] : [];
  });
  const isProved = adjustment?.observations.every(({ smallestSlip }) => smallestSlip !== null);
  const kind = suspect || disagreeing.length > 0 ? 'problem' : isProved ? 'within' : 'waiting';
  const word = { problem: 'look again', within: 'holds together', waiting: 'not proved yet' }[kind];
  return (
    <section>
      <TitleBlock title="Does it hold together?" meta={<Verdict kind={kind}>{word}</Verdict>} />
      <p className="py-2">
        <FractionWords>{words}</FractionWords>
      </p>
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

/** A settling step is a planned reading, or one taken before, again. */
function placeOfSlot(slot: string, known: ReadonlySet<string>): BookPlace | null {
  if (slot.startsWith('again:')) return { at: 'again', readingId: slot.slice('again:'.length) };
  return known.has(slot) ? { at: 'ask', slot } : null;
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
