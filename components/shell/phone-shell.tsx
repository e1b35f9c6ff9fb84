import type { ReactNode } from 'react';
import { Strip } from '@/components/ui/strip';

type PhoneShellProps = {
  /** Left on the strip: which job, which room. */
  where: ReactNode;
  /** Right on the strip: "saved here · 3 to send", or "all sent". */
  status?: ReactNode;
  children: ReactNode;
};

/** One column for one hand: the strip above, the question below it. */
export function PhoneShell({ where, status, children }: PhoneShellProps) {
  return (
    <div className="in-sun mx-auto flex min-h-dvh max-w-phone flex-col bg-sheet text-body">
      <header className="sticky top-0 z-10 pt-[env(safe-area-inset-top)]">
        <Strip status={status}>{where}</Strip>
      </header>
      <main className="flex flex-1 flex-col">{children}</main>
    </div>
  );
}
