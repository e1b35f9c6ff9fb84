import Link from 'next/link';
import { PhoneShell } from '@/components/shell/phone-shell';
import type { TodayVisit } from '@/lib/contracts/visits';
import { paths } from '@/lib/paths';
import type { Holder } from '@/lib/sync/holder';
import { QueueStatus } from './queue-status';
import { VisitScreen } from './visit-screen';

type StopScreenProps = { visit: TodayVisit; holder: Pick<Holder, 'mayReport' | 'mayMeasure'> };

/** One stop, under the strip. */
export function StopScreen({ visit, holder }: StopScreenProps) {
  const { mayReport, mayMeasure } = holder;
  return (
    <PhoneShell where={<Link href={paths.today()}>‹ Today</Link>} status={<QueueStatus />}>
      <VisitScreen {...{ visit, mayReport, mayMeasure }} />
    </PhoneShell>
  );
}
