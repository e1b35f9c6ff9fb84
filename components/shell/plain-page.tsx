import type { ReactNode } from 'react';
import { RoomSketch } from './room-sketch';
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
      {width === 'form' ? (
        <div className="grid flex-1 grid-cols-[minmax(0,1fr)] gap-16 py-6 md:py-10 lg:grid-cols-[26rem_minmax(0,1fr)]">
          <main className="max-w-form">{children}</main>
          <div className="max-w-xl max-lg:hidden">
            <RoomSketch />
          </div>
        </div>
      ) : (
        <main className="flex-1 py-6 md:py-10">{children}</main>
      )}
    </div>
  );
}
