'use client';

import { useEffect, useRef, useState } from 'react';
import { flushSync } from 'react-dom';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { TextareaField } from '@/components/ui/textarea-field';
import { TitleBlock } from '@/components/ui/title-block';
import type { Opening } from '@/lib/contracts/openings';
import type { CrewView } from '@/lib/contracts/visits';
import { doesKind } from '@/lib/schedule/visit-kind-words';
import { HoldTime } from './hold-time';
import { OpeningsList } from './openings-list';
import { useOpenings } from './openings-query';
import { subjectTitle, type TimesSubject } from './times-subject';
import { useBookOpening } from './use-book-opening';
import { useTimesKeys } from './use-times-keys';
import { anyTime, askedDays, askedWishes, halfToggled, type Wishes } from './wishes';
import { WishesBar } from './wishes-bar';

type TimesPanelProps = {
  subject: TimesSubject;
  today: string;
  /** The day on which the visit is booked now, where there is one. */
  visitDate: string | null;
  crews: readonly CrewView[];
  workdays: readonly number[];
  /** The opening that is looked at, to be drawn in the diary. */
  onLook: (opening: Opening | null) => void;
  onByHand: () => void;
  onBooked: (date: string) => void;
  onClose: () => void;
};

/** Times that work for one visit, best first: chosen by digit, booked by Enter, drawn in the diary meanwhile. */
export function TimesPanel(props: TimesPanelProps) {
  const { subject, crews, onLook, onClose } = props;
  const [wishes, setWishes] = useState(anyTime);
  const [isOverridden, setIsOverridden] = useState(false);
  const [reason, setReason] = useState('');
  const [chosen, setChosen] = useState(0);
  const panelRef = useRef<HTMLElement>(null);
  const changeWishes = (next: Wishes) => {
    setWishes(next);
    setChosen(0);
  };
  const { data, error, isPending } = useOpenings({
    jobId: subject.jobId,
    kind: subject.kind,
    wishes: askedWishes(wishes),
    isGateOverridden: isOverridden,
    limit: 9,
    ...(subject.visit ? { visitId: subject.visit.id } : {}),
    ...askedDays(wishes, props),
    ...(wishes.isForTwo ? { peopleNeeded: 2 } : {}),
  });
  const openings = data?.openings ?? [];
  const opening = openings[Math.min(chosen, openings.length - 1)];
  const booking = useBookOpening(subject, props.onBooked);

  const openingKey = opening ? `${opening.crewId} ${opening.startsAt} ${opening.endsAt}` : '';
  // The list is fetched anew by the booking itself: the diary must stay where that was, and not follow it.
  const isSettled = useRef(false);
  useLook(openingKey, opening ?? null, (looked) => {
    if (!looked || !isSettled.current) onLook(looked);
  });

  useEffect(() => panelRef.current?.focus(), []);

  const needsReason = isOverridden && reason.trim() === '';
  const book = (which = opening) => {
    if (!which || booking.isPending) return;
    if (needsReason) return panelRef.current?.querySelector('textarea')?.focus();
    isSettled.current = true;
    void booking.bookOpening(which, isOverridden ? reason : '').then((isBooked) => {
      isSettled.current = isBooked;
    });
  };
  const hold = () => {
    if (!opening || booking.isPending) return;
    void booking.holdOpening(opening, isOverridden ? reason : '');
  };
  useTimesKeys({
    count: openings.length,
    chosen,
    // Enter may follow within the same breath: it must book what the digit chose.
    choose: (index) => flushSync(() => setChosen(index)),
    book: () => book(),
    hold,
    byHand: props.onByHand,
    close: onClose,
    halfDay: (half) => changeWishes({ ...wishes, ...halfToggled(wishes, half) }),
    sooner: subject.visit ? () => changeWishes({ ...wishes, isSooner: !wishes.isSooner }) : null,
  });

  return (
    <section
      ref={panelRef}
      tabIndex={-1}
      aria-labelledby="times-title"
      className="flex min-h-0 flex-col outline-none max-lg:fixed max-lg:inset-0 max-lg:z-30 max-lg:overflow-y-auto max-lg:bg-paper max-lg:p-4"
    >
      <TitleBlock
        id="times-title"
        title={subject.visit ? 'Another time' : 'Times that work'}
        meta={
          <Button look="plain" onClick={onClose} className="-mr-3" keyName="Esc">
            Close
          </Button>
        }
      />
      <p className="pt-2 font-bold">{subjectTitle(subject)}</p>
      <p className="text-note text-graphite">
        {subject.jobTitle}
        {data?.gateWords ? ` · ${data.gateWords}` : ''}
      </p>
      {subject.says ? <p className="text-note text-ochre">“{subject.says}”</p> : null}
      {booking.held ? <HoldTime held={booking.held} onDone={onClose} /> : null}
      <WishesBar
        wishes={wishes}
        isBooked={subject.visit !== null}
        isMeasure={doesKind[subject.kind] === 'measure'}
        workdays={props.workdays}
        onChange={changeWishes}
      />
      <OpeningsList
        {...{ data, error, isPending, crews, chosen }}
        onChoose={setChosen}
        onBook={book}
        onOverride={isOverridden ? null : () => setIsOverridden(true)}
      />
      {isOverridden ? (
        <TextareaField
          label="Why it is booked all the same"
          value={reason}
          onChange={(event) => setReason(event.target.value)}
          rows={2}
          required
        />
      ) : null}
      <FormError problem={booking.problem} shownFields={[]} />
      <footer className="flex flex-wrap gap-2 border-t border-rule pt-2 max-lg:sticky max-lg:-bottom-4 max-lg:bg-paper max-lg:pb-4">
        <Button
          onClick={() => book()}
          disabled={!opening}
          keyName="Enter"
          className="max-lg:min-h-thumb max-lg:flex-1"
          busyText={booking.isPending ? 'Booking…' : undefined}
        >
          {subject.visit ? 'Move it there' : 'Book it'}
        </Button>
        <Button
          look="line"
          onClick={hold}
          disabled={!opening}
          keyName="H"
          className="max-lg:min-h-thumb"
        >
          Keep 15 min
        </Button>
        <Button
          look="plain"
          onClick={props.onByHand}
          keyName="B"
          className="px-1.5 max-lg:min-h-thumb"
        >
          By hand
        </Button>
      </footer>
    </section>
  );
}

/** Tells what is looked at, once for each other opening, and nothing any more when the panel goes. */
function useLook(key: string, opening: Opening | null, onLook: (opening: Opening | null) => void) {
  const latest = useRef({ opening, onLook });
  useEffect(() => {
    latest.current = { opening, onLook };
  });
  useEffect(() => {
    latest.current.onLook(key ? latest.current.opening : null);
  }, [key]);
  useEffect(() => () => latest.current.onLook(null), []);
}
