'use client';

import { useState } from 'react';
import { newId } from '@/components/phone/new-id';
import { usePersonId } from '@/components/phone/phone-person';
import { keepEvents } from '@/components/phone/stop-store';
import type { DayEvent } from '@/lib/contracts/day-events';

/** What a tap tells, without what every tap carries. */
export type Telling = DayEvent extends infer Event
  ? Event extends DayEvent
    ? Omit<Event, 'id' | 'visitId' | 'at'> & { id?: string }
    : never
  : never;

/** Keeps what was tapped, safe before it resolves; says when this phone could not. */
export function useTell(visitId: string) {
  const personId = usePersonId();
  const [isFailed, setIsFailed] = useState(false);
  const tell = async (telling: Telling): Promise<boolean> => {
    try {
      const event = {
        ...telling,
        id: telling.id ?? newId(),
        visitId,
        at: new Date().toISOString(),
      };
      await keepEvents(personId, [event as DayEvent]);
      setIsFailed(false);
      return true;
    } catch {
      setIsFailed(true);
      return false;
    }
  };
  return { tell, isFailed };
}
