import type { ReactNode } from 'react';
import type { CustomerVisitView } from '@/lib/contracts/visits';
import { customerWords } from './customer-words';

/** A sheet for a phone in the sun, under the shop's name and how to reach it. */
export function PageFrame({
  of,
  children,
}: {
  of: Pick<CustomerVisitView, 'language' | 'shopName' | 'shopPhone'>;
  children: ReactNode;
}) {
  return (
    <main lang={of.language} className="in-sun mx-auto min-h-dvh max-w-phone bg-sheet px-5 py-5">
      <header className="flex items-baseline justify-between gap-3 border-b border-ink pb-1">
        <b className="min-w-0 break-words">{of.shopName}</b>
        {of.shopPhone ? (
          <a
            href={`tel:${of.shopPhone}`}
            className="-my-3 shrink-0 py-3 text-note underline"
            aria-label={`${customerWords(of.language).ring}, ${of.shopPhone}`}
          >
            {of.shopPhone}
          </a>
        ) : null}
      </header>
      {children}
    </main>
  );
}
