'use client';

import { useCallback, useMemo, useRef, useState } from 'react';
import { problemOf } from '@/components/shell/ask-server';
import { sayProblem } from '@/components/shell/say-problem';
import { showToast } from '@/components/ui/toast-store';
import type { CrewView, VisitView } from '@/lib/contracts/visits';
import type { ProblemDetails } from '@/lib/problem-details';
import type { WorkingPattern } from '@/lib/time/workdays';
import type { Zone } from '@/lib/time/zones';
import { useMoveVisit } from './change-visit-query';
import { isSamePlace, type Place, placeOf, visitAt } from './place';
import { useTakeBack } from './use-take-back';

/** A move that was refused and may be tried again: on the newer visit, or with a reason. */
export type RefusedMove = { visit: VisitView; place: Place; problem: ProblemDetails };

type Shop = { zone: Zone; pattern: WorkingPattern; crews: readonly CrewView[] };

/** Presses of a key are gathered for so long, so that three steps are one move and one message. */
const gatherMs = 700;

/** Moves by hand and by key: drawn at once, ten seconds to undo, put back where the server refuses. */
export function useMover({ zone, pattern, crews }: Shop) {
  const [places, setPlaces] = useState<ReadonlyMap<string, Place>>(new Map());
  const [refused, setRefused] = useState<RefusedMove | null>(null);
  const gathering = useRef(new Map<string, ReturnType<typeof setTimeout>>());
  const underWay = useRef(new Map<string, Promise<boolean>>());
  const newest = useRef(new Map<string, VisitView>());
  const move = useMoveVisit();
  const takeBack = useTakeBack();

  const put = useCallback((visitId: string, place: Place | null) => {
    setPlaces((now) => {
      const next = new Map(now);
      if (place) next.set(visitId, place);
      else next.delete(visitId);
      return next;
    });
  }, []);

  async function send(seen: VisitView, place: Place, overrideReason = ''): Promise<boolean> {
    // Our own move before this one may still be under way, or not yet be in the diary.
    await underWay.current.get(seen.id);
    const own = newest.current.get(seen.id);
    const visit = own && own.version > seen.version ? own : seen;
    const sent = sendOne(visit, place, overrideReason);
    underWay.current.set(visit.id, sent);
    return sent;
  }

  async function sendOne(visit: VisitView, place: Place, overrideReason: string): Promise<boolean> {
    if (isSamePlace(place, placeOf(visit, zone))) {
      put(visit.id, null);
      return true;
    }
    put(visit.id, place);
    try {
      const { id: visitId, version } = visit;
      const moved = await move.mutateAsync({ visitId, version, ...place, overrideReason });
      newest.current.set(visitId, moved);
      showToast({
        text: `${moved.customerName}: ${moved.dayWords}, ${moved.windowWords}`,
        undo: () => void takeBack(moved),
      });
      return true;
    } catch (caught) {
      const problem = problemOf(caught);
      if (isWorthAsking(problem)) setRefused({ visit, place, problem });
      else sayProblem(caught);
      return false;
    } finally {
      put(visit.id, null);
    }
  }

  /** One step more: it is sent when the hand has come to rest. */
  function nudge(visit: VisitView, change: (place: Place) => Place) {
    const place = change(places.get(visit.id) ?? placeOf(visit, zone));
    put(visit.id, place);
    clearTimeout(gathering.current.get(visit.id));
    gathering.current.set(
      visit.id,
      setTimeout(() => void send(visit, place), gatherMs),
    );
  }

  const draw = useMemo(
    () => (visits: readonly VisitView[]) =>
      visits.map((visit) => {
        const place = places.get(visit.id);
        return place ? visitAt(visit, place, { pattern, zone, crews }) : visit;
      }),
    [places, pattern, zone, crews],
  );

  return {
    draw,
    send,
    nudge,
    refused,
    askAgain: setRefused,
    forgetRefused: () => setRefused(null),
  };
}

/** Refused for now: on the newer visit, or with a reason, it may go through. */
export const isWorthAsking = ({ code }: ProblemDetails) =>
  code === 'visit-changed' || code === 'gate-not-passed';
