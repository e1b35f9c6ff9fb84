import type { ReactNode } from 'react';
import { TitleBlock } from '@/components/ui/title-block';
import type { LengthUnit } from '@/lib/units/brands';
import { UnitChoice } from './unit-choice';

type CheckLayoutProps = {
  id: string;
  title: string;
  /** How it is read off the wall. */
  how: string;
  unit: LengthUnit;
  onUnit: (unit: LengthUnit) => void;
  /** What is typed. */
  fields: ReactNode;
  /** More to type, over the drawing to which it belongs. */
  fieldsOver?: ReactNode;
  /** What it looks like; faded while something is half typed. */
  drawing: ReactNode;
  isStale: boolean;
  /** What it means. */
  words: ReactNode;
  /** What is to be taken with care, or cannot be. */
  notes: string[];
};

/** One open check: the readings left, the drawing between, the meaning right. */
export function CheckLayout({
  id,
  title,
  how,
  unit,
  onUnit,
  fields,
  fieldsOver,
  drawing,
  isStale,
  words,
  notes,
}: CheckLayoutProps) {
  return (
    <section id={id}>
      <TitleBlock
        title={title}
        meta={<UnitChoice unit={unit} onUnit={onUnit} name={`${id}-unit`} />}
      />
      <p className="pt-2 text-graphite">{how}</p>
      <div className="grid items-start gap-x-8 gap-y-5 pt-4 md:grid-cols-[11rem_minmax(0,1fr)] lg:grid-cols-[11rem_minmax(0,1fr)_19rem]">
        <div className="grid grid-cols-2 items-end gap-x-4 gap-y-3 md:grid-cols-1">{fields}</div>
        <div className="min-w-0">
          {fieldsOver}
          <div className={isStale ? 'opacity-60' : ''}>{drawing}</div>
        </div>
        <div className="md:col-span-2 lg:col-span-1" aria-live="polite">
          {words}
          {notes.map((note) => (
            <p key={note} className="pt-2 text-ochre">
              {note}
            </p>
          ))}
        </div>
      </div>
    </section>
  );
}
