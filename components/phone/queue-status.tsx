'use client';

import Link from 'next/link';
import { useSyncExternalStore } from 'react';
import { Verdict, type VerdictKind } from '@/components/ui/verdict';
import { paths } from '@/lib/paths';
import { type StripState, stripState } from '@/lib/sync/strip-words';
import { usePersonId } from './phone-person';
import { readQueue } from './queue-store';
import { currentSendingState, type SendingState, subscribeToSending } from './sending-state';
import { useLive } from './use-live';

const before: SendingState = { isSignedOut: false, isOffline: false };
const marks: Record<StripState['kind'], VerdictKind> = {
  sent: 'confirmed',
  waiting: 'waiting',
  'sign-in': 'waiting',
  parked: 'problem',
};

/** Right on the strip of every phone page: what is safe here, and what the office has. */
export function QueueStatus() {
  const personId = usePersonId();
  const live = useLive('queue', readQueue);
  const sending = useSyncExternalStore(subscribeToSending, currentSendingState, () => before);
  if (live.state === 'reading') return null;
  if (live.state === 'failed') return <Verdict kind="problem">nothing can be kept here</Verdict>;
  const { kind, words } = stripState({ queue: live.value, personId, ...sending });
  const mark = <Verdict kind={marks[kind]}>{words}</Verdict>;
  if (kind === 'parked') return <Link href={`${paths.today()}#kept`}>{mark}</Link>;
  if (kind === 'sign-in') return <a href={paths.signIn(window.location.pathname)}>{mark}</a>;
  return mark;
}
