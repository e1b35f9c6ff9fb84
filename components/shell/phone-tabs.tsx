'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';

export type PhoneTab = { word: string; path: string };

export function PhoneTabs({ tabs }: { tabs: PhoneTab[] }) {
  const pathname = usePathname();
  return (
    <nav
      aria-label="Ways on"
      className="sticky bottom-0 z-10 flex border-t border-ink bg-paper pb-[env(safe-area-inset-bottom)]"
    >
      {tabs.map((tab) => {
        const isCurrent = pathname === tab.path;
        return (
          <Link
            key={tab.path}
            href={tab.path}
            aria-current={isCurrent ? 'page' : undefined}
            className={`flex min-h-thumb flex-1 items-center justify-center border-t-4 border-r border-r-rule px-2 text-center last:border-r-0 ${
              isCurrent ? 'border-t-pine font-bold' : 'border-t-transparent text-graphite'
            }`}
          >
            {tab.word}
          </Link>
        );
      })}
    </nav>
  );
}
