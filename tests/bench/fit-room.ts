/** How long one fit takes on one core, warm, and what the engine costs the phone's bundle. */
import { gzipSync } from 'node:zlib';
import { build } from 'esbuild';
import { fitRules } from '@/lib/contracts/shop-rules';
import { fitRoom } from '@/lib/measure/fit-room';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import { sampleRun, sampleUnit } from '../lib/measure/sample-runs';
import { bookOf, type TrueRoom } from '../lib/measure/true-room';

const READINGS = 300;
const WARM_UP = 400;
const TIMED = 400;

/** Ten walls, three of their corners re-entrant, out of true by what is common. */
const walls: [string, number, number][] = [
  ['A', 4_203, 89.6],
  ['B', 1_804, 90.3],
  ['C', 598, 89.7],
  ['D', 603, 270.2],
  ['E', 601, 269.9],
  ['F', 1_195, 90.4],
  ['G', 3_004, 89.8],
  ['H', 597, 90.1],
  ['I', 1_206, 270.3],
  ['J', 2_998, 89.7],
];
const room: TrueRoom = {
  closed: true,
  zRefMm: 910,
  floor: (xMm, yMm) => -0.003 * xMm + 0.001 * yMm,
  walls: walls.map(([name, lengthMm, cornerDeg], i) => ({
    name,
    lengthMm,
    cornerDeg,
    lean: [0.003, -0.002, 0.001, 0, 0.002][i % 5] ?? 0,
    bowMm: [3, -2, 1][i % 3] ?? 0,
  })),
};
const row = (from: number, count: number, widthMm = 600) =>
  Array.from({ length: count }, (_, i) => sampleUnit(from + i, { widthMm }));
const runs = [
  sampleRun(1, 0, { units: row(10, 6, 680) }),
  sampleRun(2, 0, {
    level: 'wall',
    z0Mm: 1_400,
    z1Mm: 2_100,
    carcassDepthMm: 300,
    units: row(20, 6, 680),
  }),
  sampleRun(3, 6, { right: { kind: 'open', limitMm: 2_600 }, units: row(30, 4) }),
  sampleRun(4, 9, { left: { kind: 'open', limitMm: 400 }, units: row(40, 4) }),
];
const rules = fitRules.parse(defaultShopRules('UK').fit);

const full = bookOf(room, {
  diagonals: [
    [0, 5],
    [1, 6],
    [0, 6],
  ],
  noiseMm: 0.4,
  seed: 2,
});
const withRuns = new Set(runs.map(({ wallId }) => wallId));
const spare = full.readings.filter(
  (reading) =>
    (reading.kind === 'floor' || reading.kind === 'ceiling') && !withRuns.has(reading.wallId),
);
const left = new Set(spare.slice(0, full.readings.length - READINGS).map(({ id }) => id));
const book = { ...full, readings: full.readings.filter(({ id }) => !left.has(id)) };

for (let i = 0; i < WARM_UP; i++) fitRoom(book, runs, rules);
const times: number[] = [];
for (let i = 0; i < TIMED; i++) {
  const started = performance.now();
  fitRoom(book, runs, rules);
  times.push(performance.now() - started);
}
times.sort((a, b) => a - b);
const at = (part: number) => (times[Math.floor(times.length * part)] ?? 0).toFixed(2);
console.table([
  {
    walls: room.walls.length,
    readings: book.readings.length,
    runs: runs.length,
    'median ms': at(0.5),
    'p95 ms': at(0.95),
    'least ms': at(0),
    verdicts: fitRoom(book, runs, rules)
      .runs.map(({ fill }) => fill?.verdict)
      .join(' '),
  },
]);

const bundles = {
  'fitRoom and whatIsMissing': ['fit-room', 'what-is-missing'],
  'what the phone loads: proof, plan, verdicts': [
    'prove-room',
    'reading-plan',
    'corner',
    'corner-deviation',
    'plumb',
    'straightness',
    'straightedge-gap',
    'scribe',
    'check-rule',
    'rules/rule-sets',
  ],
};
const sizes = await Promise.all(
  Object.entries(bundles).map(async ([name, modules]) => {
    const contents = modules.map((one) => `export * from '@/lib/measure/${one}';`).join('\n');
    const { outputFiles } = await build({
      stdin: { contents, resolveDir: process.cwd(), loader: 'ts' },
      bundle: true,
      minify: true,
      format: 'esm',
      write: false,
      tsconfig: 'tsconfig.json',
      logLevel: 'error',
    });
    const code = outputFiles[0]?.contents ?? new Uint8Array();
    return { bundle: name, 'kB gzipped': (gzipSync(code, { level: 9 }).length / 1_000).toFixed(1) };
  }),
);
console.table(sizes);
