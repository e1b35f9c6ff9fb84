import type { ReactNode } from 'react';
import { classNames } from './class-names';

/** A place kept for a line or a block of content; the caller gives it the shape of what will stand there. */
export function Skeleton({ className }: { className?: string }) {
  return <span className={classNames('block rounded bg-tint', className ?? 'h-4 w-full')} />;
}

/**
 * Holds the skeletons of a screen: says once what is coming, and stays unseen for the first 200 ms so
 * that a quick answer does not flicker.
 */
export function SkeletonScreen({ what, children }: { what: string; children: ReactNode }) {
  return (
    <div role="status" className="animate-[appear_0s_200ms_both]">
      <span className="sr-only">Fetching {what}…</span>
      <div aria-hidden="true">{children}</div>
    </div>
  );
}
