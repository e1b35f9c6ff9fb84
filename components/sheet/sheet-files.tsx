import type { SheetFileKind } from '@/lib/contracts/sheet-files';
import { apiPaths } from '@/lib/paths';

const files: { kind: SheetFileKind; words: string; use: string }[] = [
  { kind: 'sheet.pdf', words: 'Sheet (PDF)', use: 'to print and pin up' },
  { kind: 'cut-list.csv', words: 'Cut list (CSV)', use: 'for a spreadsheet or a saw' },
  { kind: 'drawings.svg', words: 'Drawings (SVG)', use: 'for any drawing program' },
  { kind: 'drawings.dxf', words: 'True size (DXF)', use: 'for CAD and the router' },
];

/** A released sheet to take away in open formats; on screen only. */
export function SheetFiles({ releaseId }: { releaseId: string }) {
  return (
    <nav aria-label="This sheet as files" className="mb-4 print:hidden">
      <ul className="flex flex-wrap gap-x-6 gap-y-1">
        {files.map(({ kind, words, use }) => (
          <li key={kind}>
            <a href={apiPaths.sheetFile(releaseId, kind)} download className="link">
              {words}
            </a>{' '}
            <span className="text-note text-graphite">{use}</span>
          </li>
        ))}
      </ul>
    </nav>
  );
}
