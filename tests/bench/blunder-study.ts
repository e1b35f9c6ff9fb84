/**
 * How often one wrong reading is noticed and rightly named, over random rooms.
 * Run: npx tsx tests/bench/blunder-study.ts [--rooms 2000] [--from 0] [--seed 1] [--only loose,crooked-3] [--json]
 * With --json the counts of a slice are printed to be added up: --add slice.json slice.json …
 */
import { readFileSync } from 'node:fs';
import { pathToFileURL } from 'node:url';
import { CROOKED, STRAIGHT } from '../lib/measure/random-room';
import { type Condition, type StudyRow, studyCondition } from './blunder-trials';

/** The setting of MEASURE.md §12: straight walls, one height, each reading errs for itself, u(corner) 0.12°. */
const LOOSE: Condition = {
  name: 'loose',
  title: 'straight walls, one height, loose tape class II, angle finder 0.12°',
  out: STRAIGHT,
  heightsMm: [910],
  corners: 'finder',
  usualBowMm: 0,
  slipIn: ['length', 'diagonal'],
};
const CROOKED_1: Condition = {
  name: 'crooked-1',
  title:
    'walls leaning 3 mm/m (sd) and bowed ±3 mm, one height, one tape class II, corners by legs',
  out: CROOKED,
  heightsMm: [910],
  corners: 'legs',
  usualBowMm: 3,
  slipIn: ['length', 'diagonal'],
};
const CROOKED_3: Condition = {
  ...CROOKED_1,
  name: 'crooked-3',
  title: 'the same, lengths and corners at three heights',
  heightsMm: [100, 910, 1_450],
};
/** What `whatIsMissing` asks of every wall: three lengths, and each corner once. */
const AS_ASKED: Condition = {
  ...CROOKED_3,
  name: 'as-asked',
  title: 'the same, lengths at three heights, corners at the middle one',
  cornerHeightsMm: [910],
};
const CORNERS_1: Condition = {
  ...CROOKED_1,
  name: 'corners-1',
  title: 'one height, the slip in a leg’s diagonal of a corner',
  slipIn: ['corner'],
};
const CORNERS_3: Condition = {
  ...CROOKED_3,
  name: 'corners-3',
  title: 'three heights, the slip in a leg’s diagonal of a corner',
  slipIn: ['corner'],
};
export const CONDITIONS = [LOOSE, CROOKED_1, CROOKED_3, AS_ASKED, CORNERS_1, CORNERS_3];

export const MOST_DIAGONALS = 5;

function printTable(condition: Condition, rows: StudyRow[]): void {
  console.log(`\n${condition.name}: ${condition.title}`);
  console.log(
    'cells: alarmed / named first / named among equals / wrongly named / named after the one reading asked for, %',
  );
  const head = Array.from({ length: MOST_DIAGONALS + 1 }, (_, n) => `${n} diagonals`.padEnd(36));
  console.log(`${'slip (trials)'.padEnd(22)}${head.join('')}`);
  for (const slip of new Set(rows.map((row) => row.slip))) {
    const ofSlip = rows.filter((row) => row.slip === slip);
    const cells = ofSlip.map((row) => {
      const share = (count: number) => ((100 * count) / Math.max(1, row.trials)).toFixed(1);
      const { alarmed, first, among, wrong, settled } = row;
      return [alarmed, first, among, wrong, settled].map(share).join(' / ').padEnd(36);
    });
    console.log(`${`${slip} (${ofSlip[0]?.trials ?? 0})`.padEnd(22)}${cells.join('')}`);
  }
}

type Slice = { condition: string; rows: StudyRow[] };

/** Slices of one study in one table: the counts are added up. */
function addUp(slices: Slice[]): void {
  for (const condition of CONDITIONS) {
    const [first, ...others] = slices.filter((slice) => slice.condition === condition.name);
    if (!first) continue;
    const rows = first.rows.map((row, i) => {
      const sum = { ...row };
      for (const other of others) {
        const more = other.rows[i];
        if (more?.slip !== row.slip || more.diagonals !== row.diagonals) throw new Error(row.slip);
        for (const count of ['trials', 'alarmed', 'first', 'among', 'wrong', 'settled'] as const) {
          sum[count] += more[count];
        }
      }
      return sum;
    });
    printTable(condition, rows);
  }
}

function argument(name: string, otherwise: string): string {
  const at = process.argv.indexOf(`--${name}`);
  return at < 0 ? otherwise : (process.argv[at + 1] ?? otherwise);
}

function main(): void {
  const add = process.argv.indexOf('--add');
  if (add > 0) {
    addUp(process.argv.slice(add + 1).map((file): Slice => JSON.parse(readFileSync(file, 'utf8'))));
    return;
  }
  const rooms = Number(argument('rooms', '2000'));
  const seed = Number(argument('seed', '1'));
  const from = Number(argument('from', '0'));
  const only = argument('only', '').split(',').filter(Boolean);
  for (const condition of CONDITIONS) {
    if (only.length > 0 && !only.includes(condition.name)) continue;
    const began = performance.now();
    const rows = studyCondition(condition, { rooms, seed, from, mostDiagonals: MOST_DIAGONALS });
    if (process.argv.includes('--json')) {
      console.log(JSON.stringify({ condition: condition.name, rows } satisfies Slice));
      continue;
    }
    printTable(condition, rows);
    console.log(`${rooms} rooms in ${((performance.now() - began) / 1000).toFixed(0)} s`);
  }
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) main();
