import { DayOnPhone } from '@/components/phone/day-on-phone';
import { KeptList } from '@/components/phone/kept-list';
import { QueueStatus } from '@/components/phone/queue-status';
import { SignOutPhone } from '@/components/phone/sign-out-phone';
import { PhoneShell } from '@/components/shell/phone-shell';
import type { TodayView } from '@/lib/contracts/visits';
import type { Holder } from '@/lib/sync/holder';
import { LanguageSwitch } from './language-switch';
import { TodayList } from './today-list';

type TodayScreenProps = { view: TodayView; holder: Pick<Holder, 'shopName' | 'personName'> };

/** The day: its stops, what the office would not take, what is on the phone. */
export function TodayScreen({ view, holder }: TodayScreenProps) {
  return (
    <PhoneShell where={<b>{holder.shopName}</b>} status={<QueueStatus />}>
      <TodayList view={view} />
      <KeptList />
      <DayOnPhone />
      <LanguageSwitch />
      <SignOutPhone personName={holder.personName} />
    </PhoneShell>
  );
}
