import type { SheetFileKind } from '@/lib/contracts/sheet-files';

const endings: Record<SheetFileKind, string> = {
  'sheet.pdf': '.pdf',
  'cut-list.csv': '-cut-list.csv',
  'drawings.svg': '-drawings.svg',
  'drawings.dxf': '-true-size.dxf',
};

/**
 * What a file of a sheet is called where it is saved: job, room and revision in plain words.
 *
 * Edge: what no file system likes becomes a hyphen; a room whose name is all signs is left out; letters of
 * any alphabet stay.
 * Example: job 2418, "Kitchen", A, the PDF: `2418-kitchen-rev-A.pdf`.
 */
export function sheetFileName(
  sheet: { jobNumber: number; roomName: string; revision: string },
  kind: SheetFileKind,
): string {
  const room = sheet.roomName
    .normalize('NFC')
    .toLowerCase()
    .replace(/[^\p{Letter}\p{Number}]+/gu, '-')
    .replace(/^-|-$/g, '');
  const parts = [String(sheet.jobNumber), room, `rev-${sheet.revision}`].filter(Boolean);
  return parts.join('-') + endings[kind];
}
