'use client';

import { useSyncExternalStore } from 'react';
import { Verdict, type VerdictKind } from '@/components/ui/verdict';
import { paths } from '@/lib/paths';
import { type StripState, stripState } from '@/lib/sync/strip-words';
import { phoneWords } from '@/lib/words/phone-words';
import { useHolder } from './phone-person';
import { readReadiness } from './read-readiness';
import { readUnsent } from './read-unsent';
import { currentSendingState, type SendingState, subscribeToSending } from './sending-state';
import { useCrewLanguage } from './spoken-language';
import { useLive } from './use-live';
import { hasWorker, subscribeToWorker } from './worker';

const before: SendingState = { isSignedOut: false, isOffline: false };
const marks: Record<StripState['kind'], VerdictKind> = {
  sent: 'confirmed',
  waiting: 'waiting',
  'sign-in': 'waiting',
  parked: 'problem',
};

/** Right on the strip of every phone page: what is safe here, and what the office has. */
export function QueueStatus({ isInRoom = false }: { isInRoom?: boolean }) {
  const holder = useHolder();
  const { personId } = holder;
  const language = useCrewLanguage();
  const live = useLive('unsent', readUnsent);
  const isProgramKept = useSyncExternalStore(subscribeToWorker, hasWorker, () => false);
  const ready = useLive(`ready:${isProgramKept}`, () => readReadiness(holder, isProgramKept));
  const sending = useSyncExternalStore(subscribeToSending, currentSendingState, () => before);
  if (live.state === 'reading') return null;
  if (live.state === 'failed')
    return <Verdict kind="problem">{phoneWords[language].cannotKeep}</Verdict>;
  // In a room the strip's other half says where one is, and needs the place.
  const isReady = !isInRoom && ready.state === 'here' && ready.value.isReady;
  const { kind, words } = stripState({
    unsent: live.value,
    personId,
    isReady,
    language,
    ...sending,
  });
  const mark = <Verdict kind={marks[kind]}>{words}</Verdict>;
  if (kind === 'parked') return <a href={`${paths.today()}#kept`}>{mark}</a>;
  if (kind === 'sign-in') return <a href={paths.signIn(window.location.pathname)}>{mark}</a>;
  return mark;
}
