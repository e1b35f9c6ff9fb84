import { PhoneShell } from '@/components/shell/phone-shell';
import type { TodayView } from '@/lib/contracts/visits';
import type { Holder } from '@/lib/sync/holder';
import { DayOnPhone } from './day-on-phone';
import { KeptList } from './kept-list';
import { QueueStatus } from './queue-status';
import { SignOutPhone } from './sign-out-phone';
import { TodayList } from './today-list';

type TodayScreenProps = { view: TodayView; holder: Pick<Holder, 'shopName' | 'personName'> };

/** The day: its stops, what the office would not take, what is on the phone. */
export function TodayScreen({ view, holder }: TodayScreenProps) {
  return (
    <PhoneShell where={<b>{holder.shopName}</b>} status={<QueueStatus />}>
      <TodayList view={view} personName={holder.personName} />
      <KeptList />
      <DayOnPhone />
      <SignOutPhone personName={holder.personName} />
    </PhoneShell>
  );
}
