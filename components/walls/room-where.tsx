'use client';

import { usePersonId } from '@/components/phone/phone-person';
import { readRoom } from '@/components/phone/room-store';
import { useLive } from '@/components/phone/use-live';
import type { WallBookView } from '@/lib/contracts/rooms';
import { placeHref } from './book-place';

/** Left on the strip: whose room this is, and the way to all of it. */
export function RoomWhere({ view }: { view: WallBookView }) {
  const personId = usePersonId();
  const { id, name } = view.wallBook.room;
  const live = useLive(`room:${id}`, () => readRoom(id, personId));
  const here = live.state === 'here' ? live.value?.view.wallBook.room.name : undefined;
  return (
    <a href={placeHref({ at: 'list' })}>
      <b>{view.customerName}</b> · {here || name || 'new room'}
    </a>
  );
}
