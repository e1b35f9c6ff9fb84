'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import { currentOfficePage, type OfficePage } from './office-pages';
import { ToAnswer } from './to-answer';

/** The office's pages, the current one marked by weight and by a stroke on the margin line. */
export function OfficeLinks({ pages }: { pages: OfficePage[] }) {
  const current = currentOfficePage(usePathname());
  return (
    <ul>
      {pages.map((page) => {
        const isCurrent = page.name === current?.name;
        return (
          <li key={page.name}>
            <Link
              href={page.path}
              aria-current={isCurrent ? 'page' : undefined}
              className={`flex min-h-9 items-center justify-between border-r-4 pr-3 hover:text-ink hover:underline max-md:min-h-thumb max-md:border-r-0 max-md:border-l-4 max-md:pl-3 ${
                isCurrent ? 'border-pine font-bold text-ink' : 'border-transparent text-graphite'
              }`}
            >
              {page.word}
              {page.name === 'messages' ? <ToAnswer /> : null}
            </Link>
          </li>
        );
      })}
    </ul>
  );
}
