import { inks } from '@/lib/export/layer-style';
import type { Share } from '@/lib/measure/fit-figure';
import type { Area } from './leaf';
import { putMark } from './put-mark';
import { heightOf, linesOf, putWords, type WordLook } from './words';

export type Column = { title: string; share: number; align?: 'start' | 'end' };
/** Words of a cell, each line with its look; a mark before the first where it is a verdict. */
export type Cell = {
  lines: { words: string; look?: Partial<WordLook> }[];
  mark?: Share;
  /** To be ticked with a pencil. */
  box?: true;
};
export type TableRow = { kind: 'group'; words: string } | { kind: 'row'; cells: Cell[] };

type Doc = PDFKit.PDFDocument;
type Table = { columns: readonly Column[]; rows: readonly TableRow[] };

const bodyLook: WordLook = { sizePt: 8.5 };
const titleLook: WordLook = { sizePt: 7, colour: inks.graphite };
const groupLook: WordLook = { sizePt: 9, weight: 600 };
const padPt = 3.2;
const gapPt = 13;
const titlePt = 14;
const groupPt = 19;
const markPt = 20;
const boxPt = 10;

/** Plain words in a cell. */
export const cell = (words: string, look?: Partial<WordLook>): Cell => ({
  lines: [{ words, look }],
});

/**
 * A ruled table from the top of an area down; where a row no longer goes, `nextArea` turns the page and
 * the columns are named again. Gives what is left of the last area.
 */
export function putTable(doc: Doc, table: Table, area: Area, nextArea: () => Area): Area {
  let free = putTitles(doc, table.columns, area);
  table.rows.forEach((row, index) => {
    const height = rowHeight(doc, table.columns, row, free.width);
    const next = table.rows[index + 1];
    // A group keeps with its first row.
    const together =
      row.kind === 'group' && next
        ? height + rowHeight(doc, table.columns, next, free.width)
        : height;
    if (together > free.height) free = putTitles(doc, table.columns, nextArea());
    if (row.kind === 'group') putWords(doc, row.words, groupLook, { x: free.x, y: free.y + 14 });
    else putRow(doc, table.columns, row.cells, { ...free, height });
    free = below(free, height);
  });
  return free;
}

/** How high a table comes out on one page. */
export function tableHeight(doc: Doc, { columns, rows }: Table, widthPt: number): number {
  return rows.reduce((sum, row) => sum + rowHeight(doc, columns, row, widthPt), titlePt);
}

export function below(area: Area, usedPt: number): Area {
  return { ...area, y: area.y + usedPt, height: area.height - usedPt };
}

function putTitles(doc: Doc, columns: readonly Column[], area: Area): Area {
  for (const { column, x, width } of placed(columns, area)) {
    const isEnd = column.align === 'end';
    putWords(doc, column.title, titleLook, {
      x: isEnd ? x + width : x,
      y: area.y + 8,
      anchor: isEnd ? 'end' : 'start',
    });
  }
  const y = area.y + titlePt - 2;
  doc
    .moveTo(area.x, y)
    .lineTo(area.x + area.width, y)
    .lineWidth(0.8)
    .undash()
    .stroke(inks.ink);
  return below(area, titlePt);
}

function putRow(doc: Doc, columns: readonly Column[], cells: readonly Cell[], area: Area): void {
  placed(columns, area).forEach(({ column, x, width }, index) => {
    const one = cells[index];
    if (!one) return;
    let y = area.y + padPt;
    let left = x;
    if (one.box) {
      doc.rect(x + width - boxPt, y + 0.5, boxPt, boxPt);
      doc.lineWidth(0.8).undash().stroke(inks.ink);
    }
    if (one.mark) {
      putMark(doc, one.mark, { x, y: y + bodyLook.sizePt + 0.5, heightPt: 8 });
      left += markPt;
    }
    for (const { words, look } of one.lines) {
      const whole = { ...bodyLook, ...look };
      const lines = linesOf(doc, words, whole, width - (left - x));
      lines.forEach((line, lineIndex) => {
        const isEnd = column.align === 'end';
        putWords(doc, line, whole, {
          x: isEnd ? x + width : left,
          y: y + whole.sizePt * (1 + 1.32 * lineIndex),
          anchor: isEnd ? 'end' : 'start',
        });
      });
      y += heightOf(lines.length, whole);
    }
  });
  const foot = area.y + area.height - 0.4;
  doc
    .moveTo(area.x, foot)
    .lineTo(area.x + area.width, foot)
    .lineWidth(0.4)
    .undash()
    .stroke(inks.rule);
}

function rowHeight(doc: Doc, columns: readonly Column[], row: TableRow, widthPt: number): number {
  if (row.kind === 'group') return groupPt;
  const heights = placed(columns, { x: 0, y: 0, width: widthPt, height: 0 }).map(
    ({ width }, index) => {
      const one = row.cells[index];
      if (!one) return 0;
      const wide = width - (one.mark ? markPt : 0);
      return one.lines.reduce((sum, { words, look }) => {
        const whole = { ...bodyLook, ...look };
        return sum + heightOf(linesOf(doc, words, whole, wide).length, whole);
      }, 0);
    },
  );
  return Math.max(...heights, bodyLook.sizePt * 1.3) + 2 * padPt;
}

function placed(columns: readonly Column[], area: Area) {
  const total = columns.reduce((sum, { share }) => sum + share, 0);
  const whole = area.width - gapPt * (columns.length - 1);
  let x = area.x;
  return columns.map((column) => {
    const width = (whole * column.share) / total;
    const place = { column, x, width };
    x += width + gapPt;
    return place;
  });
}
