import type { ReactNode } from 'react';

type LineLinkProps = { href: string; children: ReactNode; value?: ReactNode; note?: ReactNode };

/** One line of a list that goes somewhere: what it is, and right what it reads. */
export function LineLink({ href, children, value, note }: LineLinkProps) {
  return (
    <a
      href={href}
      className="flex min-h-thumb touch-manipulation items-center justify-between gap-3 py-1.5 active:bg-tint"
    >
      <span className="min-w-0">
        {children}
        {note ? <span className="block text-note text-graphite">{note}</span> : null}
      </span>
      <span className="shrink-0 font-bold whitespace-nowrap">
        {value}
        <span aria-hidden="true" className="ml-2 font-normal text-graphite">
          ›
        </span>
      </span>
    </a>
  );
}
