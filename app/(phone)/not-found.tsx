import { LateQueueStatus } from '@/components/phone/late-queue-status';
import { NothingHere } from '@/components/shell/nothing-here';
import { PhoneShell } from '@/components/shell/phone-shell';
import { paths } from '@/lib/paths';

/** The strip goes on saying what is safe on the phone, and sending it. */
export default function PhoneNotFound() {
  return (
    <PhoneShell where={<b>Setwell</b>} status={<LateQueueStatus />}>
      <div className="p-3.5">
        <NothingHere href={paths.today()} word="To the day" />
      </div>
    </PhoneShell>
  );
}
