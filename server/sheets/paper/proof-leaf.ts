import { inks } from '@/lib/export/layer-style';
import { figureText } from '@/lib/sheet/figure-text';
import { type ProofRow, proofRows } from '@/lib/sheet/proof-rows';
import { newLeaf, type Paper } from './leaf';
import { shareInk } from './put-mark';
import { type Cell, type Column, cell, putTable, type TableRow } from './table';
import { putWords } from './words';

const columns: Column[] = [
  { title: 'check', share: 1.8 },
  { title: 'read', share: 0.8, align: 'end' },
  { title: '± (k = 2)', share: 0.7, align: 'end' },
  { title: 'limit', share: 1.5, align: 'end' },
  { title: 'verdict', share: 1.75 },
  { title: 'whose rule, and its source', share: 3.8 },
  { title: 'what to do', share: 3.3 },
];

/** "Proved on site": every check with what was read, what its rule allows, and whose rule that is. */
export function putProofLeaf(paper: Paper): void {
  const { doc, sheet } = paper;
  const title = `${sheet.roomName}: proved on site`;
  const meta = 'over: past the limit; close: at four fifths of it or nearer, or in doubt';
  const rows = proofRows(sheet.fit, sheet.rules).map(
    (row): TableRow => ({ kind: 'row', cells: cellsOf(row, paper) }),
  );
  const area = newLeaf(paper, { title, meta });
  if (rows.length === 0) {
    const words = 'Nothing is proved yet: no corner, face or floor was read.';
    putWords(doc, words, { sizePt: 9 }, { x: area.x, y: area.y + 12 });
    return;
  }
  putTable(doc, { columns, rows }, area, () =>
    newLeaf(paper, { title: `${title}, continued`, meta }),
  );
}

function cellsOf(row: ProofRow, { sheet }: Paper): Cell[] {
  const read = row.read ? figureText(row.read, sheet.rules) : null;
  const quiet = { colour: inks.graphite, sizePt: 7.8 };
  return [
    cell(row.check, { weight: 500 }),
    {
      lines: [
        ...(read ? [{ words: read.value }] : []),
        ...(row.readWords ? [{ words: row.readWords, look: { ...quiet, sizePt: 7 } }] : []),
      ],
    },
    cell(read?.surely ?? '', quiet),
    cell(row.limitWords),
    {
      lines: [
        {
          words: verdictWords(row),
          look: { weight: 500, colour: shareInk[row.verdict] },
        },
      ],
      mark: row.verdict,
    },
    cell(row.rule, quiet),
    cell(row.verdict === 'within' ? '' : row.action, quiet),
  ];
}

function verdictWords({ key, verdict, inDoubt }: ProofRow): string {
  if (key === 'room closes') return verdict === 'within' ? 'holds' : 'disagree';
  return inDoubt ? `${verdict}, in doubt` : verdict;
}
