'use client';

import { usePathname } from 'next/navigation';
import type { ReactNode } from 'react';
import { currentOfficePage } from './office-pages';

/** The office's bar on a narrow screen: which page this is, and the menu under it. Closed by going somewhere. */
export function OfficeMenu({ children }: { children: ReactNode }) {
  const pathname = usePathname();
  return (
    <header className="border-b border-ink bg-paper md:hidden print:hidden">
      <details key={pathname} className="group">
        <summary className="flex min-h-thumb list-none items-center justify-between px-4 font-bold [&::-webkit-details-marker]:hidden">
          {currentOfficePage(pathname)?.word ?? 'Setwell'}
          <span className="font-medium text-pine">
            <span className="group-open:hidden">Menu</span>
            <span className="hidden group-open:inline">Close</span>
          </span>
        </summary>
        <div className="border-t border-rule px-4 py-3">{children}</div>
      </details>
    </header>
  );
}
