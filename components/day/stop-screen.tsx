'use client';

import Link from 'next/link';
import { type ReactNode, Suspense, useEffect } from 'react';
import { keepStop } from '@/components/phone/kept-store';
import { useHolder } from '@/components/phone/phone-person';
import { QueueStatus } from '@/components/phone/queue-status';
import { readStop } from '@/components/phone/stop-store';
import { useLive } from '@/components/phone/use-live';
import { PhoneShell } from '@/components/shell/phone-shell';
import type { StopView } from '@/lib/contracts/stops';
import type { TodayVisit } from '@/lib/contracts/visits';
import { paths } from '@/lib/paths';
import { useCrew } from './crew-language';
import {
  AsFoundScreen,
  BringScreen,
  ChecklistScreen,
  fetchStopScreens,
  NewSnagScreen,
  PhotoScreen,
  SettingScreen,
  SignScreen,
  SnagScreen,
  SnagsScreen,
} from './lazy-screens';
import { OpeningStop } from './opening-stop';
import { goToStop, type StopPlace, useStopPlace } from './stop-place';
import { VisitScreen } from './visit-screen';

type StopScreenProps = {
  visit: TodayVisit;
  /** From the office just now; null where the page came out of the phone's store. */
  stop: StopView | null;
};

/** One stop, under the strip: the office's last word on it, and over it everything that was tapped here. */
export function StopScreen({ visit, stop: fresh }: StopScreenProps) {
  const holder = useHolder();
  const { words } = useCrew();
  const place = useStopPlace();
  const live = useLive(`stop:${visit.id}`, () => readStop(visit.id, holder, fresh));
  useEffect(() => {
    if (fresh) void keepStop(fresh, holder.personId).catch(() => {});
    void fetchStopScreens();
  }, [fresh, holder.personId]);
  const stop = (live.state === 'here' ? live.value : null) ?? fresh;
  return (
    <PhoneShell where={<Link href={paths.today()}>‹ {words.today}</Link>} status={<QueueStatus />}>
      <Suspense fallback={<OpeningStop />}>
        {stop === null || place.at === 'stop' ? (
          <VisitScreen visit={visit} stop={stop} />
        ) : (
          screenAt(place, visit, stop)
        )}
      </Suspense>
    </PhoneShell>
  );
}

function screenAt(
  place: Exclude<StopPlace, { at: 'stop' }>,
  visit: TodayVisit,
  stop: StopView,
): ReactNode {
  const shown = { visit, stop };
  switch (place.at) {
    case 'bring':
      return <BringScreen {...shown} />;
    case 'checks':
      return <ChecklistScreen {...shown} />;
    case 'snags':
      return <SnagsScreen {...shown} />;
    case 'sign':
      return <SignScreen {...shown} />;
    case 'setting':
      return <SettingScreen {...shown} roomId={place.roomId} />;
    case 'as-found':
      return <AsFoundScreen {...shown} roomId={place.roomId} />;
    case 'new-snag':
      return <NewSnagScreen key={place.kind} {...shown} kind={place.kind} />;
    case 'snag':
      return (
        <SnagScreen snag={stop.snags.find(({ id }) => id === place.snagId)} visitId={visit.id} />
      );
    case 'photo': {
      const { kind, snagId } = place;
      const back = kind ? ({ at: 'new-snag', kind } as const) : ({ at: 'snag', snagId } as const);
      return <PhotoScreen photoId={place.photoId} figures={[]} onDone={() => goToStop(back)} />;
    }
  }
}
