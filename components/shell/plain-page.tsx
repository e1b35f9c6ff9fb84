import type { ReactNode } from 'react';
import { Wordmark } from './wordmark';

type PlainPageProps = {
  /** Right of the name, on the line above. */
  aside?: ReactNode;
  width?: 'form' | 'page';
  children: ReactNode;
};

/** A sheet by itself: the front, the door, and the pages that say that something is not there. */
export function PlainPage({ aside, width = 'page', children }: PlainPageProps) {
  return (
    <div className="mx-auto flex min-h-dvh max-w-page flex-col px-4 md:px-8">
      <header className="flex items-baseline justify-between gap-4 border-b border-ink pt-5 pb-2">
        <Wordmark />
        {aside}
      </header>
      <main className={`flex-1 py-6 md:py-10 ${width === 'form' ? 'w-full max-w-form' : ''}`}>
        {children}
      </main>
    </div>
  );
}
