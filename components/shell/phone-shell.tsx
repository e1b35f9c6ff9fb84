import type { ReactNode } from 'react';
import { Strip } from '@/components/ui/strip';
import { type PhoneTab, PhoneTabs } from './phone-tabs';

type PhoneShellProps = {
  /** Left on the strip: which job, which room. */
  where: ReactNode;
  /** Right on the strip: "saved here · 3 to send", or "all sent". */
  status?: ReactNode;
  /** At most three, under the thumb. */
  tabs?: [PhoneTab, PhoneTab] | [PhoneTab, PhoneTab, PhoneTab];
  children: ReactNode;
};

/** One column for one hand: the strip above, the question between, the ways on below. */
export function PhoneShell({ where, status, tabs, children }: PhoneShellProps) {
  return (
    <div className="in-sun mx-auto flex min-h-dvh max-w-phone flex-col bg-sheet text-body">
      <header className="sticky top-0 z-10 pt-[env(safe-area-inset-top)]">
        <Strip status={status}>{where}</Strip>
      </header>
      <main className="flex flex-1 flex-col">{children}</main>
      {tabs ? <PhoneTabs tabs={tabs} /> : null}
    </div>
  );
}
