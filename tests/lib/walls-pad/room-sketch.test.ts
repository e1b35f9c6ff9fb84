import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { room as roomSchema } from '@/lib/contracts/wall-book';
import {
  addWallAfter,
  insertBay,
  insertBreast,
  removeWall,
  setCorner,
  setLength,
} from '@/lib/walls-pad/change-walls';
import { closeSketch, cornerSumWords } from '@/lib/walls-pad/close-sketch';
import { expectedDiagonal } from '@/lib/walls-pad/expected-diagonal';
import { namedWalls } from '@/lib/walls-pad/name-walls';
import { roomPlan } from '@/lib/walls-pad/room-plan';
import {
  type Chains,
  chainsOfShape,
  GUESSED_MM,
  type RoomShape,
} from '@/lib/walls-pad/room-shapes';
import { walk } from '@/lib/walls-pad/walk';
import { exampleBook, exampleLength, id, wallIds } from '@/tests/help/wall-book-examples';

const shapes: RoomShape[] = ['one', 'l', 'u', 'galley', 'closed'];
const counter = () => {
  let made = 0;
  return () => id(++made);
};
const wallsOf = (chains: Chains) => chains.flatMap((chain) => chain.walls);
const namesOf = (chains: Chains) =>
  wallsOf(chains)
    .map(({ name }) => name)
    .join(' ');
const cornersOf = (chains: Chains) => wallsOf(chains).map(({ leftCornerDeg }) => leftCornerDeg);
const misclosureMm = (chains: Chains) => {
  const end = walk(
    wallsOf(chains).map((wall) => ({
      lengthMm: wall.nominalLengthMm,
      cornerDeg: wall.leftCornerDeg ?? 90,
    })),
  ).at(-1);
  return end ? Math.hypot(end.xMm, end.yMm) : 0;
};

describe('a room picked by its shape', () => {
  it.each([
    ['one', 'A', [null]],
    ['l', 'A B', [null, 90]],
    ['u', 'A B C', [null, 90, 90]],
    ['galley', 'A B', [null, null]],
    ['closed', 'A B C D', [90, 90, 90, 90]],
  ] as const)('%s has walls %s clockwise', (shape, names, corners) => {
    const chains = chainsOfShape(shape, counter());
    expect(namesOf(chains)).toBe(names);
    expect(cornersOf(chains)).toEqual(corners);
    const room = { id: id(1), name: 'Kitchen', chains };
    expect(roomSchema.safeParse(room).success).toBe(true);
  });

  it('closes when it is closed', () => {
    expect(misclosureMm(chainsOfShape('closed', counter()))).toBeLessThan(1e-6);
  });
});

describe('changing the walls', () => {
  it('makes five walls of one with a chimney breast, which still close', () => {
    const newId = counter();
    const chains = insertBreast(chainsOfShape('closed', newId), id(1), newId);
    expect(cornersOf(chains)).toEqual([90, 90, 270, 270, 90, 90, 90, 90]);
    expect(misclosureMm(chains)).toBeLessThan(1e-6);
    expect(cornerSumWords(chains)).toBeNull();
  });

  it('makes five walls of one with a bay, which still close', () => {
    const newId = counter();
    const chains = insertBay(chainsOfShape('closed', newId), id(1), newId);
    expect(cornersOf(chains)).toEqual([90, 225, 135, 135, 225, 90, 90, 90]);
    expect(misclosureMm(chains)).toBeLessThan(1e-6);
    expect(namesOf(namedWalls(chains))).toBe('A B C D E F G H');
  });

  it('names a new wall with the next free letter once walls have readings', () => {
    const newId = counter();
    const chains = addWallAfter(chainsOfShape('l', newId), id(1), {
      id: newId(),
      cornerDeg: 270,
      lengthMm: 1_000,
    });
    expect(namesOf(namedWalls(chains, new Set([id(1), id(2)])))).toBe('A C B');
    expect(namesOf(namedWalls(chains))).toBe('A B C');
  });

  it('goes on after Z', () => {
    const walls = Array.from({ length: 28 }, (_, at) => ({
      id: id(at),
      name: '',
      nominalLengthMm: 1,
      leftCornerDeg: 90,
    }));
    expect(namesOf(namedWalls([{ closed: true, walls }]))).toMatch(/Y Z AA AB$/);
  });

  it('turns on as before when the wall between two corners goes', () => {
    const newId = counter();
    let chains = chainsOfShape('l', newId);
    chains = addWallAfter(chains, id(2), { id: newId(), cornerDeg: 270, lengthMm: 900 });
    expect(cornersOf(removeWall(chains, id(2)))).toEqual([null, 180]);
  });

  it('keeps the last wall', () => {
    const chains = chainsOfShape('one', counter());
    expect(removeWall(chains, id(1))).toEqual(chains);
  });

  it('opens a closed room that is left with two walls', () => {
    let chains = chainsOfShape('closed', counter());
    for (const number of [1, 2]) chains = removeWall(chains, id(number));
    expect(chains[0]).toMatchObject({ closed: false, walls: [{ leftCornerDeg: null }, {}] });
  });

  it('leaves no corner at a free end', () => {
    const chains = chainsOfShape('l', counter());
    expect(cornersOf(setCorner(chains, id(1), 135))).toEqual([null, 90]);
    expect(cornersOf(setCorner(chains, id(2), 135))).toEqual([null, 135]);
    expect(cornersOf(removeWall(chains, id(1)))).toEqual([null]);
  });

  it('never loses or doubles a wall, whatever is tapped', () => {
    const tap = fc.record({
      what: fc.integer({ min: 0, max: 5 }),
      at: fc.nat(),
      deg: fc.constantFrom(90, 270, 135, 225),
    });
    fc.assert(
      fc.property(fc.constantFrom(...shapes), fc.array(tap, { maxLength: 12 }), (shape, taps) => {
        const newId = counter();
        let chains = chainsOfShape(shape, newId);
        for (const { what, at, deg } of taps) {
          const walls = wallsOf(chains);
          const wallId = walls[at % walls.length]?.id ?? '';
          if (what === 0) chains = insertBreast(chains, wallId, newId);
          if (what === 1) chains = insertBay(chains, wallId, newId);
          if (what === 2) chains = removeWall(chains, wallId);
          if (what === 3) chains = setCorner(chains, wallId, deg);
          if (what === 4)
            chains = addWallAfter(chains, wallId, { id: newId(), cornerDeg: deg, lengthMm: 800 });
          if (what === 5) chains = setLength(chains, wallId, 1_234);
          chains = namedWalls(chains);
        }
        const ids = wallsOf(chains).map((wall) => wall.id);
        const names = wallsOf(chains).map((wall) => wall.name);
        expect(ids.length).toBeGreaterThan(0);
        expect(new Set(ids).size).toBe(ids.length);
        expect(new Set(names).size).toBe(names.length);
        for (const chain of chains) {
          expect(
            chain.walls.every(
              (wall, at) => (wall.leftCornerDeg === null) === (at === 0 && !chain.closed),
            ),
          ).toBe(true);
        }
      }),
    );
  });
});

describe('closeSketch', () => {
  it('lets the wall facing the one that was typed follow it', () => {
    const chains = setLength(chainsOfShape('closed', counter()), id(1), 4_000);
    const closed = closeSketch(chains, new Set([id(1)]));
    expect(wallsOf(closed).map(({ nominalLengthMm }) => nominalLengthMm)).toEqual([
      4_000,
      GUESSED_MM.across,
      4_000,
      GUESSED_MM.across,
    ]);
  });

  it('closes an L-shaped room from four of six typed lengths', () => {
    const newId = counter();
    const lengthsMm = [5_000, 3_000, 2_000, 1_000, 100, 100];
    const chains: Chains = [
      {
        closed: true,
        walls: lengthsMm.map((nominalLengthMm, at) => ({
          id: newId(),
          name: '',
          nominalLengthMm,
          leftCornerDeg: at === 4 ? 270 : 90,
        })),
      },
    ];
    const closed = closeSketch(chains, new Set([1, 2, 3, 4].map(id)));
    expect(wallsOf(closed).map(({ nominalLengthMm }) => nominalLengthMm)).toEqual([
      5_000, 3_000, 2_000, 1_000, 3_000, 2_000,
    ]);
  });

  it('leaves typed lengths alone even when they gape', () => {
    const chains = setLength(chainsOfShape('closed', counter()), id(1), 9_000);
    expect(closeSketch(chains, new Set([1, 2, 3, 4].map(id)))).toEqual(chains);
  });

  it('leaves open chains alone', () => {
    const chains = chainsOfShape('u', counter());
    expect(closeSketch(chains, new Set())).toEqual(chains);
  });

  it('says when the corners cannot close', () => {
    const chains = setCorner(chainsOfShape('closed', counter()), id(2), 135);
    expect(cornerSumWords(chains)).toBe(
      'The corners add up to 405°; 4 walls that meet have 360°. Set another corner.',
    );
  });
});

describe('roomPlan', () => {
  it('draws a closed room closed, and marks what was read', () => {
    const plan = roomPlan(exampleBook([exampleLength(1, { valueMm: 4_010 })]));
    expect(plan.walls.map(({ name, readMm }) => [name, readMm])).toEqual([
      ['A', 4_010],
      ['B', null],
      ['C', null],
      ['D', null],
    ]);
    const [first, last] = [plan.outlines[0]?.points[0], plan.outlines[0]?.points.at(-1)];
    expect(last).toEqual(first);
  });

  it('sets the two sides of a galley against each other at the width read', () => {
    const chains = chainsOfShape('galley', counter());
    const { kind: _k, wallId: _w, yMm: _y, ...rest } = exampleLength(1);
    const book = {
      ...exampleBook([
        {
          ...rest,
          kind: 'width',
          wallId: id(1),
          toWallId: id(2),
          xMm: 300,
          valueMm: 2_222,
        } as const,
      ]),
      room: { ...exampleBook().room, chains },
    };
    const [a, b] = roomPlan(book).walls;
    expect((b?.from.yMm ?? 0) - (a?.from.yMm ?? 0)).toBeCloseTo(2_222, 6);
    expect(b?.to.xMm).toBeLessThan(b?.from.xMm ?? 0);
  });
});

describe('expectedDiagonal', () => {
  it('is silent until the walls between are read', () => {
    expect(expectedDiagonal(exampleBook(), wallIds.A, wallIds.C)).toBeNull();
  });

  it('is silent along one wall', () => {
    const book = exampleBook([exampleLength(1)]);
    expect(expectedDiagonal(book, wallIds.A, wallIds.B)).toBeNull();
  });
});
