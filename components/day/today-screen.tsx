'use client';

import { type ReactNode, Suspense, useEffect } from 'react';
import { DayOnPhone } from '@/components/phone/day-on-phone';
import { KeptList } from '@/components/phone/kept-list';
import { readSnagsToMend } from '@/components/phone/mend-store';
import { useHolder } from '@/components/phone/phone-person';
import { QueueStatus } from '@/components/phone/queue-status';
import { SignOutPhone } from '@/components/phone/sign-out-phone';
import { useLive } from '@/components/phone/use-live';
import { PhoneShell } from '@/components/shell/phone-shell';
import type { CrewSnag } from '@/lib/contracts/snags';
import type { TodayView } from '@/lib/contracts/visits';
import { LanguageSwitch } from './language-switch';
import { fetchMendScreens, MendScreen, PhotoScreen, SnagScreen } from './lazy-screens';
import { MendLine } from './mend-line';
import { MendWhere } from './mend-where';
import { OpeningStop } from './opening-stop';
import { goToStop, type StopPlace, useStopPlace } from './stop-place';
import { TodayList } from './today-list';

/** The day: its stops, what is to be mended on any job, what the office would not take, what is on the phone. */
export function TodayScreen({ view }: { view: TodayView }) {
  const holder = useHolder();
  const place = useStopPlace();
  const live = useLive(`mend:${view.date}`, () => readSnagsToMend(view, holder));
  const snags = live.state === 'here' ? live.value : view.snags;
  const hasSnags = snags.length > 0;
  useEffect(() => {
    if (hasSnags) void fetchMendScreens();
  }, [hasSnags]);
  const opened = openedAt(place, snags);
  return (
    <PhoneShell where={<b>{holder.shopName}</b>} status={<QueueStatus />}>
      {opened ? (
        <Suspense fallback={<OpeningStop />}>{opened}</Suspense>
      ) : (
        <>
          <TodayList view={view} />
          <MendLine snags={snags} />
          <KeptList />
          <DayOnPhone />
          <LanguageSwitch />
          <SignOutPhone personName={holder.personName} />
        </>
      )}
    </PhoneShell>
  );
}

/** What is opened over the day; null: the day itself. */
function openedAt(place: StopPlace, snags: readonly CrewSnag[]): ReactNode {
  switch (place.at) {
    case 'snags':
      return <MendScreen snags={snags} />;
    case 'snag': {
      const snag = snags.find(({ id }) => id === place.snagId);
      return (
        <SnagScreen
          key={place.snagId}
          snag={snag}
          visitId={snag?.visitId ?? ''}
          lead={snag ? <MendWhere snag={snag} /> : null}
        />
      );
    }
    case 'photo':
      return (
        <PhotoScreen
          photoId={place.photoId}
          figures={[]}
          onDone={() => goToStop({ at: 'snag', snagId: place.snagId })}
        />
      );
    default:
      return null;
  }
}
