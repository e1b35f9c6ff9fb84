'use client';

import { Draggable } from '@fullcalendar/interaction';
import { useEffect, useRef, useState } from 'react';
import { Button } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { ErrorState } from '@/components/ui/error-state';
import { controlLook } from '@/components/ui/field-frame';
import { Skeleton, SkeletonScreen } from '@/components/ui/skeleton';
import { TitleBlock } from '@/components/ui/title-block';
import type { VisitView, WaitingItem } from '@/lib/contracts/visits';
import { useFoundVisits } from './find-visits-query';
import { FoundVisits } from './found-visits';
import { WaitingLine } from './waiting-line';
import type { Waiting } from './waiting-query';

/** Jobs that need a visit booked, each with from when or why not yet. Dragged into the diary, or opened. */
export function WaitingList({
  waiting,
  mayBook,
  isCalendarShown,
  onTimes,
  onFound,
  onFold,
}: {
  waiting: Waiting;
  mayBook: boolean;
  /** The calendar takes what is dragged by its own means; the crews' board has its own. */
  isCalendarShown: boolean;
  onTimes: (item: WaitingItem) => void;
  /** A visit that is booked already was looked for by what is typed. */
  onFound: (visit: VisitView) => void;
  onFold: () => void;
}) {
  const { all, shown, typed, setTyped, error, isPending } = waiting;
  const listRef = useRef<HTMLUListElement>(null);
  const hasItems = shown.length > 0;
  const { found, isAsking } = useFoundVisits(typed);
  const [opensFirst, setOpensFirst] = useState(false);

  // Enter follows the last letter at once: what was asked by then is opened when it is found.
  useEffect(() => {
    if (!opensFirst || isAsking) return;
    setOpensFirst(false);
    if (found[0]) onFound(found[0]);
  }, [opensFirst, isAsking, found, onFound]);

  useEffect(() => {
    if (!listRef.current || !mayBook || !hasItems || !isCalendarShown) return;
    const draggable = new Draggable(listRef.current, {
      itemSelector: '[data-waiting]',
      eventData: (element) => ({
        title: element.getAttribute('data-title') ?? '',
        duration: { minutes: Number(element.getAttribute('data-minutes')) },
        create: false,
      }),
    });
    return () => draggable.destroy();
  }, [mayBook, hasItems, isCalendarShown]);

  return (
    <section aria-labelledby="waiting-title" className="flex min-h-0 flex-1 flex-col">
      <TitleBlock
        id="waiting-title"
        title="Waiting to be booked"
        meta={
          <span className="flex items-baseline gap-2">
            {all?.length}
            <Button
              look="plain"
              onClick={onFold}
              aria-label="Fold the waiting list away"
              className="-my-2 -mr-2 px-1.5 max-lg:hidden"
            >
              fold
            </Button>
          </span>
        }
      />
      {error ? (
        <ErrorState title="The waiting list could not be fetched">
          The diary is still here. It is tried again by itself.
        </ErrorState>
      ) : null}
      {isPending ? (
        <SkeletonScreen what="the waiting list">
          {[1, 2, 3, 4].map((line) => (
            <Skeleton key={line} className="mt-3 h-14 w-full" />
          ))}
        </SkeletonScreen>
      ) : null}
      {all?.length === 0 ? (
        <EmptyState title="Nothing waits">
          Every job has its next visit. A new call begins with <kbd>N</kbd> on Jobs.
        </EmptyState>
      ) : null}
      {all ? (
        <input
          type="search"
          id="waiting-search"
          aria-label="Find who waits or is booked"
          placeholder="Find who waits or is booked  (F)"
          value={typed}
          onChange={(event) => {
            setOpensFirst(false);
            setTyped(event.target.value);
          }}
          onKeyDown={(event) => {
            const first = mayBook ? shown[0] : undefined;
            if (event.key !== 'Enter' || !typed.trim()) return;
            event.preventDefault();
            event.currentTarget.blur();
            if (first) onTimes(first);
            else setOpensFirst(true);
          }}
          className={`${controlLook} mt-2`}
        />
      ) : null}
      {hasItems || !typed.trim() ? null : (
        <p className="py-3 text-graphite">Nobody who waits fits “{typed}”.</p>
      )}
      <ul ref={listRef} className="min-h-0 overflow-y-auto">
        {shown.map((item, index) => (
          <WaitingLine
            key={`${item.jobId}-${item.kind}`}
            item={item}
            number={index < 9 ? index + 1 : null}
            mayBook={mayBook}
            onTimes={() => onTimes(item)}
          />
        ))}
      </ul>
      {found.length > 0 ? <FoundVisits visits={found} onOpen={onFound} /> : null}
    </section>
  );
}
