import type { ReactNode } from 'react';
import { Glyph } from './glyph';

type ErrorStateProps = {
  /** What happened. */
  title: string;
  /** What was kept and what to do. */
  children: ReactNode;
  action?: ReactNode;
};

/** In place of content that could not be shown. */
export function ErrorState({ title, children, action }: ErrorStateProps) {
  return (
    <div
      role="alert"
      className="flex max-w-prose flex-col items-start gap-3 border border-l-4 border-chalk px-5 py-5"
    >
      <p className="text-lead font-bold text-chalk">
        <Glyph name="problem" className="-ml-[0.3em] mr-[0.1em]" />
        {title}
      </p>
      <div>{children}</div>
      {action}
    </div>
  );
}
