import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { clearOpening, placeWords } from '@/lib/measure/clear-opening';
import type { EndFacePoint } from '@/lib/measure/face-surface';
import { figure } from '@/lib/measure/figure';
import type { RunFrame } from '@/lib/measure/run-frame';
import { mirrored, planeEnd, runFrame, wallEnd } from './run-frames';
import { monteCarlo, seeded } from './seeded';

const band = { depthMm: 600, z0Mm: 100, z1Mm: 870 };

function opened(frame: RunFrame, over: Partial<typeof band> = {}) {
  const result = clearOpening({ frame, ...band, ...over });
  if (!result.value) throw new Error(JSON.stringify(result.problems));
  return result.value;
}

describe('the worked example', () => {
  test('a left corner of 89 degrees takes 10.47 mm at the front edge', () => {
    const result = opened(runFrame({ left: wallEnd({ angleDeg: 89 }) }));
    expect(result.opening.value).toBeCloseTo(2_400 - 600 / Math.tan((89 * Math.PI) / 180), 6);
    expect(result.opening.value).toBeCloseTo(2_389.53, 2);
    expect(placeWords(result.left, band, (mm) => `${mm} mm`)).toBe(
      'left end, front edge, at the floor',
    );
  });

  test('an open corner gives nothing away at the back', () => {
    const result = opened(runFrame({ right: wallEnd({ angleDeg: 92 }) }));
    expect(result.opening.value).toBeCloseTo(2_400, 6);
    expect(result.right.yMm).toBe(0);
  });

  test('a wall that leans in decides at the top, from the height of the length', () => {
    const lean = figure(0.01, 0, ['plumb']);
    const result = opened(runFrame({ right: wallEnd({ lean }), zRefMm: 100 }));
    expect(result.opening.value).toBeCloseTo(2_400 - 7.7, 6);
    expect(result.right.zMm).toBe(870);
    expect(result.opening.from).toContain('plumb');
  });

  test('a bulge inside the depth governs by its reading', () => {
    const points = facePoints([
      [100, 100, 0],
      [300, 500, 6],
      [600, 870, 0],
      [100, 870, 0],
      [600, 100, 0],
    ]);
    const result = opened(runFrame({ left: wallEnd({ points }) }));
    expect(result.left.readingId).toBe('face-1');
    expect(result.opening.value).toBeCloseTo(2_394, 6);
    expect(result.opening.from).toContain('face-1');
  });

  test('another run in the corner stands in the way by its front', () => {
    const left = {
      meets: 'run' as const,
      angle: figure(90, 0.1, ['angle']),
      otherTurnDeg: 0,
      frontMm: 625,
      frontUMm: 0.5,
      from: ['other'],
    };
    expect(opened(runFrame({ left })).opening.value).toBeCloseTo(1_775, 6);
  });

  test('a casing is a plane square to the run', () => {
    expect(opened(runFrame({ right: planeEnd(1_500, 1) })).opening).toMatchObject({
      value: 1_500,
      U: 2,
    });
  });

  test('a turned set line turns both corners: one closes by what the other opens', () => {
    const turnDeg = 0.5;
    const offset = (degrees: number) => 600 / Math.tan((degrees * Math.PI) / 180);
    const result = opened(runFrame({ turnDeg }));
    const L = 2_400 * Math.cos((turnDeg * Math.PI) / 180);
    // The right corner lies behind the turned line, and its face is met further along.
    const cornerBehind = 2_400 * Math.sin((turnDeg * Math.PI) / 180);
    const right = L - cornerBehind / Math.tan((90.5 * Math.PI) / 180);
    expect(result.opening.value).toBeCloseTo(right - offset(89.5), 6);
  });
});

describe('problems', () => {
  test('an outside corner is an open end', () => {
    const result = clearOpening({ frame: runFrame({ left: wallEnd({ angleDeg: 270 }) }), ...band });
    expect(result.value).toBeNull();
    expect(result.problems[0]).toMatchObject({ code: 'end-is-open', about: ['angle'] });
  });

  test('a length that is not a number gives a problem and names the reading', () => {
    const frame = runFrame({ length: figure(Number.NaN, 0, ['bad']) });
    const result = clearOpening({ frame, ...band });
    expect(result.value).toBeNull();
    expect(result.problems[0]).toMatchObject({ code: 'not-a-number', about: ['bad'] });
  });

  test('ends that overlap leave no opening', () => {
    const result = clearOpening({ frame: runFrame({ right: planeEnd(-5) }), ...band });
    expect(result.problems[0]?.code).toBe('no-opening');
  });
});

const frames = fc
  .record({
    length: fc.double({ min: 1_200, max: 4_000, noNaN: true }),
    turn: fc.double({ min: -1.5, max: 1.5, noNaN: true }),
    standOff: fc.double({ min: 0, max: 25, noNaN: true }),
    angles: fc.tuple(
      fc.double({ min: 80, max: 100, noNaN: true }),
      fc.double({ min: 80, max: 100, noNaN: true }),
    ),
    leans: fc.tuple(
      fc.double({ min: -0.02, max: 0.02, noNaN: true }),
      fc.double({ min: -0.02, max: 0.02, noNaN: true }),
    ),
    grids: fc.tuple(gridOfGaps(), gridOfGaps()),
  })
  .map(({ length, turn, standOff, angles, leans, grids }) =>
    runFrame({
      length: figure(length, 0.8, ['length']),
      turnDeg: turn,
      standOffMm: standOff,
      left: wallEnd({
        angle: figure(angles[0], 0.1, ['left-angle']),
        lean: figure(leans[0], 0.0005, ['left-lean']),
        points: grids[0],
      }),
      right: wallEnd({
        angle: figure(angles[1], 0.1, ['right-angle']),
        lean: figure(leans[1], 0.0005, ['right-lean']),
        points: grids[1],
      }),
    }),
  );

const GRID_Y = [80, 350, 720];
const GRID_Z = [50, 480, 910];

function gridOfGaps() {
  return fc
    .array(fc.double({ min: -9, max: 9, noNaN: true }), { minLength: 9, maxLength: 9 })
    .map((b) =>
      facePoints(GRID_Y.flatMap((y, i) => GRID_Z.map((z, j) => [y, z, b[i * 3 + j] ?? 0]))),
    );
}

function facePoints(rows: number[][]): EndFacePoint[] {
  return rows.map(([yMm = 0, zMm = 0, bMm = 0], i) => ({
    yMm,
    zMm,
    proudMm: bMm,
    uMm: 0.5,
    leanShareMm: 0,
    bowShare: 0,
    readingId: `face-${i}`,
  }));
}

/** Written apart from the engine: walls as curves in the plan, cut by the turned front planes. */
function bruteForce(frame: RunFrame, steps: number): number {
  const turn = (frame.turnDeg * Math.PI) / 180;
  const along = [Math.cos(turn), Math.sin(turn)] as const;
  const out = [-Math.sin(turn), Math.cos(turn)] as const;
  let greatestLeft = -Infinity;
  let leastRight = Infinity;
  for (let i = 0; i <= steps; i++) {
    for (let j = 0; j <= steps; j++) {
      const y = (band.depthMm * i) / steps;
      const z = band.z0Mm + ((band.z1Mm - band.z0Mm) * j) / steps;
      const p = [y * out[0], frame.standOffMm + y * out[1]] as const;
      for (const end of ['left', 'right'] as const) {
        const face = frame[end];
        if (face.meets !== 'wall') continue;
        const theta = (face.angle.value * Math.PI) / 180;
        // Wall line through its corner, pushed into the room by what stands proud here.
        const corner = end === 'left' ? [0, 0] : [frame.length.value, 0];
        const direction =
          end === 'left' ? [Math.cos(theta), Math.sin(theta)] : [-Math.cos(theta), Math.sin(theta)];
        const intoRoom =
          end === 'left'
            ? [direction[1], -(direction[0] ?? 0)]
            : [-(direction[1] ?? 0), direction[0]];
        const proud = bilinear(face.points, y, z);
        const q = [
          (corner[0] ?? 0) + proud * (intoRoom[0] ?? 0),
          (corner[1] ?? 0) + proud * (intoRoom[1] ?? 0),
        ];
        // p + x·along lies on the wall: (p + x·along − q)·intoRoom = 0.
        const normal = [intoRoom[0] ?? 0, intoRoom[1] ?? 0];
        const gap =
          ((q[0] ?? 0) - p[0]) * (normal[0] ?? 0) + ((q[1] ?? 0) - p[1]) * (normal[1] ?? 0);
        const x = gap / (along[0] * (normal[0] ?? 0) + along[1] * (normal[1] ?? 0));
        if (end === 'left') greatestLeft = Math.max(greatestLeft, x);
        else leastRight = Math.min(leastRight, x);
      }
    }
  }
  return leastRight - greatestLeft;
}

function bilinear(points: EndFacePoint[], y: number, z: number): number {
  const at = (i: number, j: number) => points[i * 3 + j]?.proudMm ?? 0;
  const place = (value: number, places: number[]) => {
    const inside = Math.min(Math.max(value, places[0] ?? 0), places[2] ?? 0);
    const i = inside >= (places[1] ?? 0) ? 1 : 0;
    const low = places[i] ?? 0;
    return { i, t: (inside - low) / ((places[i + 1] ?? 1) - low) };
  };
  const a = place(y, GRID_Y);
  const b = place(z, GRID_Z);
  const low = at(a.i, b.i) * (1 - b.t) + at(a.i, b.i + 1) * b.t;
  const high = at(a.i + 1, b.i) * (1 - b.t) + at(a.i + 1, b.i + 1) * b.t;
  return low * (1 - a.t) + high * a.t;
}

describe('properties', () => {
  test('is never larger than a dense search over the faces, and equals it on their own lines', () => {
    fc.assert(
      fc.property(frames, (frame) => {
        const value = opened(frame).opening.value;
        const dense = bruteForce(frame, 60);
        expect(value).toBeLessThanOrEqual(dense + 1e-6);
        expect(dense - value).toBeLessThan(1.5);
      }),
      { numRuns: 60, endOnFailure: true, seed: 1 },
    );
  });

  test('a mirrored run has the same opening and the same U', () => {
    fc.assert(
      fc.property(frames, (frame) => {
        const plain = opened(frame);
        const turned = opened(mirrored(frame));
        expect(turned.opening.value).toBeCloseTo(plain.opening.value, 5);
        expect(turned.opening.u).toBeCloseTo(plain.opening.u, 4);
        expect(turned.safeMm).toBeCloseTo(plain.safeMm, 3);
      }),
      { numRuns: 100, endOnFailure: true, seed: 1 },
    );
  });

  test('the safe opening is no larger than the opening less its U', () => {
    fc.assert(
      fc.property(frames, (frame) => {
        const { opening, safeMm } = opened(frame);
        expect(safeMm).toBeLessThanOrEqual(opening.value - opening.U + 1e-9);
      }),
      { numRuns: 100, endOnFailure: true, seed: 1 },
    );
  });

  test('does not change its input', () => {
    const frame = runFrame({ left: wallEnd({ points: facePoints([[300, 500, 4]]) }) });
    const before = JSON.stringify(frame);
    opened(frame);
    expect(JSON.stringify(frame)).toBe(before);
  });
});

describe('uncertainty', () => {
  test('agrees with a Monte Carlo of length, angles, leans and a face reading', () => {
    const base = {
      length: figure(2_400, 0.8, ['l']),
      leftAngle: figure(88.5, 0.12, ['a']),
      rightAngle: figure(89, 0.15, ['b']),
      leftLean: figure(0.004, 0.0006, ['c']),
      rightLean: figure(0.006, 0.0004, ['d']),
    };
    const build = (shift: number[]) =>
      runFrame({
        turnDeg: 0.4,
        standOffMm: 8,
        length: figure(base.length.value + (shift[0] ?? 0), 0.8, ['l']),
        left: wallEnd({
          angle: figure(88.5 + (shift[1] ?? 0), 0.12, ['a']),
          lean: figure(0.004 + (shift[2] ?? 0), 0.0006, ['c']),
          points: facePoints([[600, 870, 3 + (shift[5] ?? 0)]]),
        }),
        right: wallEnd({
          angle: figure(89 + (shift[3] ?? 0), 0.15, ['b']),
          lean: figure(0.006 + (shift[4] ?? 0), 0.0004, ['d']),
        }),
      });
    const u = [0.8, 0.12, 0.0006, 0.15, 0.0004, 0.5];
    const gauss = seeded(7).normal;
    const { sd } = monteCarlo(
      2_500,
      () => opened(build(u.map((value) => value * gauss()))).opening.value,
    );
    expect(opened(build([])).opening.u / sd).toBeGreaterThan(0.95);
    expect(opened(build([])).opening.u / sd).toBeLessThan(1.05);
  });
});
