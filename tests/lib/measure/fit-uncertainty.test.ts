import { expect, test } from 'vitest';
import type { Reading } from '@/lib/contracts/readings';
import { fitRules } from '@/lib/contracts/shop-rules';
import type { Tool, WallBook } from '@/lib/contracts/wall-book';
import type { Fit } from '@/lib/measure/fit';
import type { FitFigure } from '@/lib/measure/fit-figure';
import { fitRoom } from '@/lib/measure/fit-room';
import { defaultShopRules } from '@/lib/measure/rules/default-rules';
import {
  type BoundedEnds,
  lengthOwnPart,
  slopeUncertainty,
  toolCommonPart,
} from '@/lib/measure/uncertainty';
import { sampleRun, sampleUnit } from './sample-runs';
import { seeded } from './seeded';
import { bookOf, level, type TrueRoom, tape } from './true-room';

const rules = fitRules.parse(defaultShopRules('UK').fit);
const room: TrueRoom = {
  closed: true,
  zRefMm: 910,
  walls: [
    { name: 'A', lengthMm: 3_003, cornerDeg: 89.4, lean: 0.004, bowMm: 3 },
    { name: 'B', lengthMm: 2_412, cornerDeg: 90.7, lean: -0.003, bowMm: -2 },
    { name: 'C', lengthMm: 2_990, cornerDeg: 89.2, lean: 0.002, bowMm: 1 },
    { name: 'D', lengthMm: 2_400, cornerDeg: 90.7, lean: 0.001, bowMm: 2 },
  ],
};
const runs = [
  sampleRun(1, 1, { units: [600, 900, 800].map((widthMm, i) => sampleUnit(i, { widthMm })) }),
];

/** One room's worth of error: each tool's own, the same in all it reads, and each reading's. */
function withErrors(book: WallBook, gauss: () => number): WallBook {
  const ofTool = new Map<Tool, number>([tape, level].map((tool) => [tool, gauss()]));
  const plumbErrors = new Map<string, number>();
  const error = (tool: Tool, mm: number, ends: BoundedEnds) =>
    (ofTool.get(tool) ?? 0) * toolCommonPart(tool, mm, ends) + gauss() * lengthOwnPart(tool);
  const readings = book.readings.map((reading): Reading => {
    if (reading.kind === 'length' || reading.kind === 'diagonal') {
      return { ...reading, valueMm: reading.valueMm + error(tape, reading.valueMm, 2) };
    }
    if (reading.kind === 'corner' && reading.by.method === 'legs') {
      const { legLeftMm, legRightMm, diagonalMm } = reading.by;
      return {
        ...reading,
        by: {
          ...reading.by,
          legLeftMm: legLeftMm + error(tape, legLeftMm, 1),
          legRightMm: legRightMm + error(tape, legRightMm, 1),
          diagonalMm: diagonalMm + error(tape, diagonalMm, 0),
        },
      };
    }
    if (reading.kind === 'face') {
      const plumb = plumbErrors.get(reading.setUpId) ?? gauss() * slopeUncertainty(level);
      plumbErrors.set(reading.setUpId, plumb);
      const off = gauss() * lengthOwnPart(level) + plumb * (reading.zMm - 910);
      return { ...reading, gapMm: reading.gapMm + off };
    }
    return reading;
  });
  return { ...book, readings };
}

const figuresOf = (fit: Fit): Record<string, FitFigure | undefined> => {
  const run = fit.runs[0];
  return {
    length: fit.walls[1]?.length ?? undefined,
    angle: fit.corners[1]?.angle ?? undefined,
    opening: run?.clearOpening?.opening,
    filler: run?.left.filler?.widths.at(-1)?.width,
  };
};

test('what is stated as u is how far figures of rooms read with that error lie from the truth', () => {
  const exact = bookOf(room, { diagonals: [[0, 2]], floors: false });
  const truth = figuresOf(fitRoom(exact, runs, rules));
  const gauss = seeded(21).normal;
  const squares: Record<string, number> = {};
  const rooms = 50;
  for (let i = 0; i < rooms; i++) {
    const found = figuresOf(fitRoom(withErrors(exact, gauss), runs, rules));
    for (const [name, figure] of Object.entries(found)) {
      const off = (figure?.value ?? 0) - (truth[name]?.value ?? 0);
      squares[name] = (squares[name] ?? 0) + (off / (figure?.u || 1)) ** 2 / rooms;
    }
  }
  // 1 is just right; less is on the safe side: a room's own redundancy is only partly counted.
  for (const [name, square] of Object.entries(squares)) {
    expect({ name, ratio: Math.sqrt(square) }).toSatisfy(
      ({ ratio }: { ratio: number }) => ratio > 0.45 && ratio < 1.2,
    );
  }
}, 60_000);
