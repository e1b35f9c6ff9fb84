'use client';

import { KeyHint } from '@/components/ui/key-hint';
import { openList } from './open-list';

/** What the keys / and ? do, for the pointer and the thumb. */
export function ListButtons() {
  return (
    <div className="flex flex-col gap-1">
      <button
        type="button"
        onClick={() => openList('commands')}
        className="flex min-h-9 items-center justify-between gap-2 rounded border border-graphite bg-sheet px-2 text-graphite hover:text-ink max-md:min-h-thumb"
      >
        Find a job
        <KeyHint keys="/" />
      </button>
      <button
        type="button"
        onClick={() => openList('keys')}
        className="flex min-h-9 items-center justify-between gap-2 px-2 text-graphite hover:text-ink hover:underline max-md:hidden"
      >
        Keys
        <KeyHint keys="?" />
      </button>
    </div>
  );
}
