import type { ReactNode } from 'react';

type EmptyStateProps = {
  /** What would stand here: "No jobs yet". */
  title: string;
  /** What to do first. */
  children: ReactNode;
  /** The button that does it. */
  action?: ReactNode;
};

/** A screen with nothing on it says what to do first. */
export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <div className="flex max-w-prose flex-col items-start gap-3 border border-dashed border-graphite px-5 py-6">
      <p className="text-lead font-bold">{title}</p>
      <div className="text-graphite">{children}</div>
      {action}
    </div>
  );
}
