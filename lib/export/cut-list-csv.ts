import type { SheetView } from '@/lib/contracts/rooms';
import { figureWords } from '@/lib/measure/explain';
import type { FitFigure } from '@/lib/measure/fit-figure';
import { type CutRow, cutList } from '@/lib/sheet/cut-list';
import { figureText } from '@/lib/sheet/figure-text';
import { type CsvCell, csvText } from './csv';
import { supersededWords } from './sheet-stamp';

export const cutListColumns = [
  'piece',
  'run',
  'end',
  'work',
  'top or left',
  'bottom or right',
  'blank',
  'plus or minus',
  'top or left mm',
  'bottom or right mm',
  'blank mm',
  'plus or minus mm',
  'saw deg',
  'note',
  'job',
  'room',
  'revision',
  'state',
] as const;

/**
 * The cut list of a released sheet for a spreadsheet or a saw: sizes as the shop writes them, rounded the
 * way each kind asks for, and exact in mm beside them.
 *
 * Edge: every row names its revision and whether that still holds, so that rows of two prints cannot be
 * mixed up; an angle has no mm and stands in degrees.
 * Example: a filler of 54 to 46 mm face is `Filler,Sink wall,left,blank,54 mm,46 mm,64 mm,…,63.5,…`.
 */
export function cutListCsv(sheet: SheetView): string {
  const rows = cutList(sheet.fit, sheet.runs, sheet.rules.region).map((row) => rowOf(row, sheet));
  return csvText([cutListColumns, ...rows]);
}

function rowOf(row: CutRow, sheet: SheetView): CsvCell[] {
  // The end has its own column.
  const piece = row.end === null ? row.piece : row.piece.replace(`, ${row.end}`, '');
  const words = (figure: FitFigure | null) => (figure ? textOf(figure, sheet).value : '');
  const mm = (figure: FitFigure | null) => (figure && isLength(figure) ? figure.value : null);
  return [
    piece,
    row.runName,
    row.end,
    row.how,
    words(row.first),
    words(row.last),
    words(row.cut),
    textOf(row.cut, sheet).surely,
    mm(row.first),
    mm(row.last),
    mm(row.cut),
    isLength(row.cut) ? row.cut.U : null,
    isLength(row.cut) ? null : row.cut.value,
    row.note,
    sheet.jobNumber,
    sheet.roomName,
    sheet.release.revision,
    supersededWords(sheet) ?? 'stands',
  ];
}

/** A true minus: a spreadsheet takes a hyphen in front for a formula. */
function textOf(figure: FitFigure, { rules }: SheetView) {
  const { value, surely } = figureText(figure, rules);
  return { value: value.replace(/^-/, '−'), surely };
}

const isLength = ({ kind }: FitFigure) => figureWords[kind].measure === 'length';
