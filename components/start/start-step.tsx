import type { ReactNode } from 'react';
import { Glyph } from '@/components/ui/glyph';

type StartStepProps = {
  number: number;
  title: string;
  isDone: boolean;
  /** Stands open: what comes next. */
  isNext: boolean;
  children: ReactNode;
};

/** One step of a new shop: done where it stands, and opened again by a touch. */
export function StartStep({ number, title, isDone, isNext, children }: StartStepProps) {
  return (
    <li className="border-b border-rule">
      <details open={isNext} className="group">
        <summary className="grid min-h-thumb cursor-pointer list-none grid-cols-[2.25rem_1fr_auto] items-baseline py-3 [&::-webkit-details-marker]:hidden">
          <span className="text-lead font-bold tabular-nums">{number}</span>
          <span className={isNext ? 'text-lead font-bold' : 'font-medium'}>{title}</span>
          {isDone ? (
            <span className="font-medium text-moss">
              <Glyph name="within" className="mr-1" />
              done
            </span>
          ) : (
            <span className="text-note text-pine underline underline-offset-4 group-open:hidden">
              open
            </span>
          )}
        </summary>
        <div className="flex flex-col items-start gap-3 pb-5 pl-9">{children}</div>
      </details>
    </li>
  );
}
