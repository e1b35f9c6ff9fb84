'use client';

import { Draggable } from '@fullcalendar/interaction';
import { useEffect, useRef } from 'react';
import { EmptyState } from '@/components/ui/empty-state';
import { ErrorState } from '@/components/ui/error-state';
import { Skeleton, SkeletonScreen } from '@/components/ui/skeleton';
import { TitleBlock } from '@/components/ui/title-block';
import type { WaitingItem } from '@/lib/contracts/visits';
import { WaitingLine } from './waiting-line';
import { useWaiting } from './waiting-query';

/** Jobs that need a visit booked, each with from when or why not yet. Dragged into the diary, or opened. */
export function WaitingList({
  mayBook,
  isCalendarShown,
  onBook,
}: {
  mayBook: boolean;
  /** The calendar takes what is dragged by its own means; the crews' board has its own. */
  isCalendarShown: boolean;
  onBook: (item: WaitingItem) => void;
}) {
  const { data: items, error, isPending } = useWaiting();
  const listRef = useRef<HTMLUListElement>(null);
  const hasItems = Boolean(items?.length);

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
    <section aria-labelledby="waiting-title" className="flex min-h-0 flex-col">
      <TitleBlock id="waiting-title" title="Waiting to be booked" meta={items?.length} />
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
      {items?.length === 0 ? (
        <EmptyState title="Nothing waits">
          Every job has its next visit. A new call begins with <kbd>N</kbd> on Jobs.
        </EmptyState>
      ) : null}
      <ul ref={listRef} className="min-h-0 overflow-y-auto">
        {items?.map((item, index) => (
          <WaitingLine
            key={`${item.jobId}-${item.kind}`}
            item={item}
            number={index < 9 ? index + 1 : null}
            mayBook={mayBook}
            onBook={() => onBook(item)}
          />
        ))}
      </ul>
    </section>
  );
}
