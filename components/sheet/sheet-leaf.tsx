import type { ReactNode } from 'react';
import { InFractions } from '@/components/fit/in-fractions';
import { TitleBlock } from '@/components/ui/title-block';
import { TitleStamp } from '@/components/ui/title-stamp';
import type { SheetView } from '@/lib/contracts/rooms';
import { paths } from '@/lib/paths';
import { SupersededBand } from './superseded-band';

type SheetLeafProps = {
  sheet: SheetView;
  /** "Plan", "Wall A". */
  title: string;
  meta: string;
  leaf: { number: number; count: number };
  drawing: ReactNode;
  /** Beside the drawing, under the title block: the revision stands on the first page whatever follows. */
  children: ReactNode;
};

/** One page of the shop sheet: a drawing, what belongs to it, and the title block at its corner. */
export function SheetLeaf({ sheet, title, meta, leaf, drawing, children }: SheetLeafProps) {
  const { release, jobId, wallBook, newerRevision } = sheet;
  return (
    <section className="sheet-leaf mb-6 border border-ink bg-sheet px-5 py-4">
      <SupersededBand
        revision={release.revision}
        newerRevision={newerRevision}
        newerHref={newerRevision ? paths.sheet(jobId, wallBook.room.id, newerRevision) : null}
        supersededBy={sheet.supersededBy}
      />
      <TitleBlock title={title} meta={meta} />
      <div className="mt-3 grid gap-x-6 gap-y-4 lg:grid-cols-[minmax(0,1fr)_23rem] print:grid-cols-[minmax(0,1fr)_88mm]">
        <div className="sheet-drawing min-w-0">{drawing}</div>
        <div className="flex min-w-0 flex-col gap-4">
          <TitleStamp cells={stampCells(sheet, leaf)} />
          {children}
        </div>
      </div>
    </section>
  );
}

function stampCells(sheet: SheetView, { number, count }: SheetLeafProps['leaf']) {
  const { release, rules } = sheet;
  return [
    { label: 'Setwell shop sheet', value: sheet.shopName },
    {
      label: 'revision',
      value: <span className="text-title font-bold">{release.revision}</span>,
    },
    {
      label: `job ${sheet.jobNumber}, ${sheet.jobTitle}`,
      value: `${sheet.customerName}, ${sheet.street}`,
    },
    { label: 'room', value: sheet.roomName },
    { label: 'measured', value: sheet.measuredWords },
    { label: 'released', value: `${release.releasedBy}, ${release.releasedAtWords}` },
    {
      label: 'bench',
      value: release.takenUpWords ? `taken up: ${release.takenUpWords}` : 'not taken up yet',
    },
    {
      label: `leaf ${number} of ${count}`,
      value: (
        <InFractions
          words={`${rules.unit === 'in' ? 'inches' : 'mm'}; ± is k = 2; engine ${sheet.engineVersion}`}
        />
      ),
    },
  ];
}
