import type { ReactNode } from 'react';
import { classNames } from './class-names';

type TitleBlockProps = {
  title: ReactNode;
  /** Right, on the same line: revision, date, keys, a count. */
  meta?: ReactNode;
  level?: 1 | 2 | 3;
  id?: string;
  className?: string;
};

const headingLooks = { 1: 'text-title', 2: 'text-lead', 3: 'text-body' };

/** Heads a section as a drawing's title block does: title left, revision and date right, one line under. */
export function TitleBlock({ title, meta, level = 2, id, className }: TitleBlockProps) {
  const Heading = `h${level}` as const;
  return (
    <header
      className={classNames(
        'flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1 border-b border-ink pb-1',
        className,
      )}
    >
      <Heading id={id} className={classNames('font-bold', headingLooks[level])}>
        {title}
      </Heading>
      {meta ? <div className="text-note text-graphite">{meta}</div> : null}
    </header>
  );
}
