'use client';

import { lazy, Suspense, useEffect, useState } from 'react';
import { usePersonId } from '@/components/phone/phone-person';
import { startRefreshing } from '@/components/phone/refresh-room';
import { readRoom, rememberRoom } from '@/components/phone/room-store';
import { useLive } from '@/components/phone/use-live';
import { ErrorState } from '@/components/ui/error-state';
import { Skeleton, SkeletonScreen } from '@/components/ui/skeleton';
import type { WallBookView } from '@/lib/contracts/rooms';
import { type KeptOnPhone, readKept } from './kept-on-phone';

/** Begun at once, beside the reading of the store: the strip sends before the pad is here. */
const fetchBook = () => import('./book-screens').then((m) => ({ default: m.BookScreens }));
const BookScreens = lazy(fetchBook);

type WallBookScreenProps = {
  view: WallBookView;
  /** Shown from the phone's store, without the office. */
  isStale?: boolean;
};

/** The wall book on the phone: the office's last word, and over it everything that is kept here. */
export function WallBookScreen({ view, isStale = false }: WallBookScreenProps) {
  const personId = usePersonId();
  const roomId = view.wallBook.room.id;
  const [kept, setKept] = useState<KeptOnPhone | null>(null);
  const [isBroken, setIsBroken] = useState(false);
  const live = useLive(`room:${roomId}`, () => readRoom(roomId, personId));

  useEffect(() => {
    let isShown = true;
    fetchBook().catch(() => null);
    Promise.all([readKept(view), rememberRoom(view, personId)])
      .then(([read]) => isShown && setKept(read))
      .catch(() => isShown && setIsBroken(true));
    return () => {
      isShown = false;
    };
  }, [view, personId]);

  useEffect(() => startRefreshing({ roomId, personId, isStale }), [roomId, personId, isStale]);

  if (isBroken || live.state === 'failed') return <NothingKept />;
  if (live.state === 'reading' || live.value === null || kept === null) return <Opening />;
  return (
    <Suspense fallback={<Opening />}>
      <BookScreens key={roomId} room={live.value} kept={kept} />
    </Suspense>
  );
}

function Opening() {
  return (
    <SkeletonScreen what="the wall book">
      <div className="flex flex-col gap-3 p-3.5">
        <Skeleton className="h-44 w-full" />
        <Skeleton className="h-6 w-3/4" />
        <Skeleton className="h-12 w-1/2" />
        <Skeleton className="h-64 w-full" />
      </div>
    </SkeletonScreen>
  );
}

/** Without a store a reading would live in the page alone, and be lost with it: so none is taken. */
function NothingKept() {
  return (
    <div className="p-3.5">
      <ErrorState title="This browser keeps nothing">
        <p>
          Readings would be lost when the page is closed, so none are taken here. Leave the private
          window, free some space, or use another browser.
        </p>
      </ErrorState>
    </div>
  );
}
