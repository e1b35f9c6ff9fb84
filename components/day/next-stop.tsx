'use client';

import Link from 'next/link';
import { useHolder } from '@/components/phone/phone-person';
import { useLive } from '@/components/phone/use-live';
import { readNextVisit } from '@/components/phone/visit-store';
import { buttonLook } from '@/components/ui/button-look';
import type { TodayVisit } from '@/lib/contracts/visits';
import { paths } from '@/lib/paths';
import { useCrew } from './crew-language';
import { windowIn } from './visit-times';

/** Once a stop is over, the one after it is one tap away; after the last, the day. */
export function NextStop({ visit }: { visit: TodayVisit }) {
  const { zone } = useHolder();
  const crew = useCrew();
  const { words } = crew;
  const live = useLive(`next:${visit.id}`, () => readNextVisit(visit));
  const next = live.state === 'here' ? live.value : undefined;
  if (next === undefined) return null;
  if (next === null) {
    return (
      <Link href={paths.today()} className={buttonLook('line', 'thumb')}>
        {words.today}
      </Link>
    );
  }
  return (
    <Link href={paths.todayVisit(next.id)} className={buttonLook('fill', 'thumb')}>
      {words.nextStop}: {windowIn(next, crew, zone)}, {next.customerName}
    </Link>
  );
}
