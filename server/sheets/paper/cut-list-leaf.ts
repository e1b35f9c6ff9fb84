import { inks } from '@/lib/export/layer-style';
import { figureWords } from '@/lib/measure/explain';
import type { FitFigure } from '@/lib/measure/fit-figure';
import type { KickCorner, RunFit } from '@/lib/measure/run-fit';
import { type CutRow, cutList } from '@/lib/sheet/cut-list';
import { figureText } from '@/lib/sheet/figure-text';
import { unitWords } from '@/lib/sheet/unit-words';
import { formatLength } from '@/lib/units/format-length';
import { tradeName, tradeWord } from '@/lib/words/trade';
import { newLeaf, type Paper } from './leaf';
import { below, type Cell, type Column, cell, putTable, type TableRow, tableHeight } from './table';
import { putWords } from './words';

const cutColumns: Column[] = [
  { title: 'piece', share: 2.1 },
  { title: 'top or left', share: 1, align: 'end' },
  { title: 'bottom or right', share: 1, align: 'end' },
  { title: 'cut', share: 1.5, align: 'end' },
  { title: '± (k = 2)', share: 0.8, align: 'end' },
  { title: 'exact, mm', share: 0.9, align: 'end' },
  { title: 'to what, and why', share: 3.6 },
  { title: 'done', share: 0.6, align: 'end' },
];

const kickColumns: Column[] = [
  { title: 'unit', share: 2.4 },
  { title: 'front left', share: 1, align: 'end' },
  { title: 'front right', share: 1, align: 'end' },
  { title: 'back left', share: 1, align: 'end' },
  { title: 'back right', share: 1, align: 'end' },
  { title: '± (k = 2)', share: 0.8, align: 'end' },
  { title: 'legs', share: 3 },
];

/** Everything to be cut, on one page where it goes, for whoever stands at the saw; then the kick heights. */
export function putCutListLeaf(paper: Paper): void {
  const { doc, sheet } = paper;
  const title = `${sheet.roomName}: cut list and ${tradeWord('kick', sheet.rules.region)} heights`;
  const unit = sheet.rules.unit === 'in' ? 'inches' : 'millimetres';
  const meta = `${unit}; blanks and allowances rounded up once`;
  const next = () => newLeaf(paper, { title: `${title}, continued`, meta });
  const cuts = cutRows(paper);
  let free = newLeaf(paper, { title, meta });
  if (cuts.length === 0) {
    putWords(doc, 'Nothing to cut.', { sizePt: 9 }, { x: free.x, y: free.y + 12 });
    free = below(free, 20);
  } else free = putTable(doc, { columns: cutColumns, rows: cuts }, free, next);
  const kicks = sheet.fit.runs.flatMap((run) => kickRows(paper, run));
  if (kicks.length === 0) return;
  free = below(free, 14);
  const kickTable = { columns: kickColumns, rows: kicks };
  // Heights of one run are compared with one another: they are not torn apart without need.
  if (tableHeight(doc, kickTable, free.width) > free.height) free = next();
  putTable(doc, kickTable, free, next);
}

function cutRows({ sheet }: Paper): TableRow[] {
  const rows = cutList(sheet.fit, sheet.runs, sheet.rules.region);
  const runNames = [...new Set(rows.map(({ runName }) => runName))];
  return runNames.flatMap((runName): TableRow[] => [
    { kind: 'group', words: runName },
    ...rows
      .filter((row) => row.runName === runName)
      .map((row): TableRow => ({ kind: 'row', cells: cutCells(row, sheet) })),
  ]);
}

function cutCells(row: CutRow, { rules, revised }: Paper['sheet']): Cell[] {
  const value = (figure: FitFigure | null) => (figure ? figureText(figure, rules).value : '');
  const isLength = figureWords[row.cut.kind].measure === 'length';
  const how = row.how === 'leave long' ? 'leave ' : row.how === 'saw' ? 'saw ' : '';
  return [
    cell(row.piece, { weight: 500 }),
    cell(value(row.first)),
    cell(value(row.last)),
    {
      lines: [
        { words: `${how}${value(row.cut)}`, look: { sizePt: 10.5, weight: 600 } },
        ...changeLines(row, revised),
      ],
    },
    cell(figureText(row.cut, rules).surely, { colour: inks.graphite }),
    cell(isLength ? row.cut.value.toFixed(1) : '', { colour: inks.graphite }),
    row.isWrong
      ? { lines: [{ words: row.note, look: { colour: inks.chalk } }], mark: 'over' }
      : cell(row.note, { colour: inks.graphite }),
    { lines: [], box: true },
  ];
}

/** "rev B, was" and under it the size that no longer holds, struck. */
function changeLines({ key }: CutRow, revised: Paper['sheet']['revised']): Cell['lines'] {
  const mark = revised?.marks.find((one) => one.on === 'cut' && one.key === key);
  if (!revised || !mark) return [];
  const look = { sizePt: 7, colour: inks.chalk };
  if (mark.was === null) return [{ words: `rev ${revised.revision}, new`, look }];
  return [
    { words: `rev ${revised.revision}, was`, look },
    { words: mark.was, look: { sizePt: 8, colour: inks.graphite, isStruck: true } },
  ];
}

function kickRows({ sheet }: Paper, run: RunFit): TableRow[] {
  const { kicks } = run;
  if (!kicks) return [];
  const laidOut = sheet.runs.find(({ id }) => id === run.runId);
  const { rules } = sheet;
  const rows = run.units.flatMap(({ unitId }, index): TableRow[] => {
    const corners = kicks.corners.filter((corner) => corner.unitId === unitId);
    const unit = laidOut?.units.find(({ id }) => id === unitId);
    if (corners.length === 0 || !unit) return [];
    const at = (corner: KickCorner['corner']) => {
      const found = corners.find((one) => one.corner === corner);
      return cell(found ? figureText(found.height, rules).value : '');
    };
    const worst = corners.reduce((most, one) => (one.height.U > most.height.U ? one : most));
    return [
      {
        kind: 'row',
        cells: [
          cell(
            `${index + 1}. ${unitWords(unit, rules.region)} ${formatLength(unit.widthMm, rules)}`,
            {
              weight: 500,
            },
          ),
          at('front-left'),
          at('front-right'),
          at('back-left'),
          at('back-right'),
          cell(figureText(worst.height, rules).surely, { colour: inks.graphite }),
          legsCell(corners),
        ],
      },
    ];
  });
  return rows.length === 0
    ? []
    : [
        {
          kind: 'group',
          words: `${tradeName('kick', rules.region)} heights, ${run.name}: ${lower(kicks.words)}`,
        },
        ...rows,
      ];
}

function legsCell(corners: readonly KickCorner[]): Cell {
  const low = corners.some(({ legs }) => legs === 'too-low');
  const high = corners.some(({ legs }) => legs === 'too-high');
  const carried = corners.some(({ extrapolated }) => extrapolated)
    ? 'floor carried on, not read'
    : '';
  const look = { colour: inks.graphite };
  if (!low && !high) {
    const doubt = corners.some(({ inDoubt }) => inDoubt) ? 'within, in doubt' : 'within';
    return cell([doubt, carried].filter(Boolean).join('; '), look);
  }
  const words = low ? 'too low for the legs' : 'too high for the legs';
  return {
    lines: [{ words: [words, carried].filter(Boolean).join('; '), look: { colour: inks.chalk } }],
    mark: 'over',
  };
}

const lower = (words: string) => words.charAt(0).toLowerCase() + words.slice(1);
