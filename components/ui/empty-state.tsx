import type { ReactNode } from 'react';

type EmptyStateProps = {
  /** What would stand here: "No jobs yet". */
  title: string;
  /** What to do first. */
  children: ReactNode;
  /** The button that does it. */
  action?: ReactNode;
  /** It is all that the page says, and so its heading. */
  isPage?: boolean;
};

/** A screen with nothing on it says what to do first. */
export function EmptyState({ title, children, action, isPage = false }: EmptyStateProps) {
  const Title = isPage ? 'h1' : 'p';
  return (
    <div className="mt-3 flex max-w-prose flex-col items-start gap-3 border border-dashed border-graphite px-5 py-6">
      <Title className="text-lead font-bold">{title}</Title>
      <div className="text-graphite">{children}</div>
      {action}
    </div>
  );
}
