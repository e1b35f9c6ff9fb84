import type { ReactNode } from 'react';

export type StampCell = { label: string; value: ReactNode };

/** The boxed corner of a drawing: two columns of small label over value, ruled. */
export function TitleStamp({ cells }: { cells: StampCell[] }) {
  return (
    <dl className="grid grid-cols-2 gap-px border border-ink bg-rule">
      {cells.map((cell) => (
        <div key={cell.label} className="bg-sheet px-2.5 py-1.5 print:py-0.5 last:odd:col-span-2">
          <dt className="text-note text-graphite">{cell.label}</dt>
          <dd className="font-medium">{cell.value}</dd>
        </div>
      ))}
    </dl>
  );
}
