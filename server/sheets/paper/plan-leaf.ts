import { drawPlan } from '@/lib/drawing/plan';
import { inks } from '@/lib/export/layer-style';
import { shareOfRun } from '@/lib/export/run-facts';
import { troubleOf } from '@/lib/export/trouble';
import type { Share } from '@/lib/measure/fit-figure';
import { cautionsFor } from '@/lib/sheet/cautions';
import { proofRows } from '@/lib/sheet/proof-rows';
import type { Paragraph, Section } from './column';
import type { Paper } from './leaf';
import { putBeside } from './put-beside';

/** The first page: the room seen from above, and what the bench must know before anything else. */
export function putPlanLeaf(paper: Paper): void {
  const { sheet } = paper;
  putBeside(paper, {
    title: `${sheet.roomName}: plan`,
    view: 'seen from above',
    draw: (look) => drawPlan(sheet, look),
    sections: [
      sinceThen(paper),
      changes(paper),
      pointsOpen(paper),
      runs(paper),
      proved(paper),
      trouble(paper),
      cautions(paper),
    ],
  });
}

const listed = (words: string, look?: Paragraph['look']): Paragraph => ({
  words,
  look,
  isListed: true,
});

/** Past this many they are counted: the page is for the bench, the whole list is on the screen. */
const mostTold = 6;

function told(changes: readonly string[]): string[] {
  if (changes.length <= mostTold) return [...changes];
  const more = changes.length - mostTold + 1;
  return [...changes.slice(0, mostTold - 1), `and ${more} more: see the sheet on the screen`];
}

/** Why the sheet no longer holds. */
function sinceThen({ sheet }: Paper): Section {
  const look = { colour: inks.chalk, weight: 500 } as const;
  return {
    title: `Since revision ${sheet.release.revision}`,
    paragraphs: told(sheet.supersededBy).map((words) => listed(words, look)),
  };
}

function changes({ sheet }: Paper): Section {
  const { release } = sheet;
  if (release.revision === 'A') {
    return { title: 'First release', paragraphs: [{ words: 'No sheet of this room is older.' }] };
  }
  return {
    title: 'Changed since the revision before',
    paragraphs: release.changes.map((words) => listed(words)),
  };
}

function pointsOpen({ sheet }: Paper): Section {
  return {
    title: 'Released with points open',
    paragraphs: sheet.overrideReason ? [{ words: sheet.overrideReason, mark: 'close' }] : [],
  };
}

function runs({ sheet }: Paper): Section {
  return {
    title: 'Runs',
    paragraphs: sheet.fit.runs.map(({ name, fill }): Paragraph => {
      if (!fill) return { words: `${name}: not filled, too little is read.`, mark: 'over' };
      return { words: `${name}: ${lower(fill.words)}`, mark: shareOfRun[fill.verdict] };
    }),
  };
}

/** How many checks came out how; each stands on the last page. */
function proved({ sheet }: Paper): Section {
  const rows = proofRows(sheet.fit, sheet.rules);
  const count = (share: Share) => rows.filter(({ verdict }) => verdict === share).length;
  const worst = (['over', 'close', 'within'] as const).find((share) => count(share) > 0);
  const words = `${count('over')} checks over, ${count('close')} close, ${count('within')} within: see the last leaf.`;
  return { title: 'Proved on site', paragraphs: worst ? [{ words, mark: worst }] : [] };
}

function trouble({ sheet }: Paper): Section {
  const { suspect } = sheet.fit.closure;
  const words = [
    ...(suspect ? [suspect.words] : []),
    ...troubleOf(
      sheet.fit,
      sheet.runs.map(({ id }) => id),
    ),
  ];
  return {
    title: 'To watch',
    paragraphs: words.map((one): Paragraph => ({ words: one, mark: 'over' })),
  };
}

function cautions({ sheet }: Paper): Section {
  const { runs: laidOut, wallBook, isOldHouse } = sheet;
  return {
    title: 'Cautions',
    paragraphs: cautionsFor({ runs: laidOut, readings: wallBook.readings, isOldHouse }).map(
      (words) => listed(words),
    ),
  };
}

const lower = (words: string) => words.charAt(0).toLowerCase() + words.slice(1);
