'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { problemOf } from '@/components/shell/ask-server';
import { controlLook } from '@/components/ui/field-frame';
import { showToast } from '@/components/ui/toast-store';
import { sendReady } from './ready-query';

/** The day on which the cabinets of a job are, or will be, ready; emptied, it is taken back. */
export function ReadyField({ jobId, readyOn }: { jobId: string; readyOn: string | null }) {
  const router = useRouter();
  const [isBusy, setIsBusy] = useState(false);
  async function say(day: string) {
    setIsBusy(true);
    try {
      await sendReady(jobId, day || null);
      showToast({
        text: day ? 'Said. The waiting list knows.' : 'Taken back.',
        undo: () => void say(readyOn ?? ''),
      });
      router.refresh();
    } catch (caught) {
      showToast({ text: problemOf(caught).title, isProblem: true });
    } finally {
      setIsBusy(false);
    }
  }
  return (
    <input
      key={readyOn ?? ''}
      type="date"
      aria-label="Cabinets ready on"
      aria-busy={isBusy}
      defaultValue={readyOn ?? ''}
      className={`${controlLook} w-40`}
      onBlur={(event) => {
        const day = event.target.value;
        if (!isBusy && day !== (readyOn ?? '')) void say(day);
      }}
    />
  );
}
