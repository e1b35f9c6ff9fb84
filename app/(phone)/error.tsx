'use client';

import { LateQueueStatus } from '@/components/phone/late-queue-status';
import { PageError, type PageErrorProps } from '@/components/shell/page-error';
import { PhoneShell } from '@/components/shell/phone-shell';

/** The strip goes on saying what is safe on the phone, and sending it. */
export default function PhoneErrorPage(props: PageErrorProps) {
  return (
    <PhoneShell where={<b>Setwell</b>} status={<LateQueueStatus />}>
      <div className="p-3.5">
        <PageError {...props} />
      </div>
    </PhoneShell>
  );
}
