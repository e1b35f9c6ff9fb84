/** What the hung boxes of a run catch, and what on the wall they meet. */
import type { ReadingOf } from '@/lib/contracts/readings';
import { type CollisionFound, collisions, type WallFeature } from '@/lib/measure/collisions';
import type { Collision } from '@/lib/measure/fit';
import type { FitContext } from '@/lib/measure/fit-context';
import type { WorkedRun } from '@/lib/measure/fit-runs';
import { frontDepth } from '@/lib/measure/room-walk';
import type { UnitStuds } from '@/lib/measure/run-fit';
import { studCatch } from '@/lib/measure/studs';
import type { Problem } from '@/lib/problem';

/** A stud finder says where a stud's middle or edge is within ±5 mm; from memory. */
const STUD_U_MM = 5 / Math.sqrt(3);
/** A planed two-by-four is 38 mm thick; from memory. */
const STUD_WIDTH_MM = 38;
/** Gables are cut from board of 18 or 19 mm; from memory. */
const GABLE_MM = 18;
/** Appliances and open spaces have no gables. */
const WITHOUT_GABLES = ['dishwasher', 'range', 'refrigerator', 'open', 'hood', 'panel'];

/** The studs behind each hung unit; nothing for base runs or where no stud was found. */
export function fitStuds(
  context: FitContext,
  { run, filled }: WorkedRun,
): { studs: ReadonlyMap<string, UnitStuds>; problems: Problem[] } {
  const studs = context.book.ofKind('stud').filter(({ wallId }) => wallId === run.wallId);
  const found = new Map<string, UnitStuds>();
  if (run.level === 'base' || !filled || studs.length === 0) return { studs: found, problems: [] };
  const { rules } = context;
  const caught = studCatch({
    studs: studs.map(({ id, xMm, at }) => ({ id, xMm, u: STUD_U_MM, at })),
    units: filled.placed.map(({ id, leftMm, rightMm }) => ({ unitId: id, leftMm, rightMm })),
    openings: featuresOf(context, run.wallId)
      .filter(({ feature }) => ['window', 'door', 'opening'].includes(feature))
      .map(({ x0Mm, x1Mm }) => ({ x0Mm, x1Mm })),
    wallLengthMm: context.frames.get(run.wallId)?.length.value ?? 0,
    spacingsMm: rules.studSpacingsMm,
    studWidthMm: STUD_WIDTH_MM,
    screwEdgeMm: rules.screwEdgeMm,
    studsNeeded: rules.studsNeeded,
  });
  for (const unit of caught.value?.units ?? []) {
    found.set(unit.unitId, {
      studs: unit.studs.map(({ xMm, predicted }) => ({ xMm, predicted })),
      needed: unit.needed,
      enough: unit.enough,
      words: unit.words,
    });
  }
  return { studs: found, problems: caught.problems };
}

function featuresOf(context: FitContext, wallId: string): ReadingOf<'feature'>[] {
  return context.book.ofKind('feature').filter((feature) => feature.wallId === wallId);
}

/** What on the wall meets the boxes and fillers of a run. */
export function fitCollisions(context: FitContext, { run, filled }: WorkedRun): Collision[] {
  const features = featuresOf(context, run.wallId).map(
    ({ id, feature, x0Mm, x1Mm, z0Mm, z1Mm, projectionMm, swing }): WallFeature => ({
      readingId: id,
      kind: feature,
      x0Mm: Math.min(x0Mm, x1Mm),
      x1Mm: Math.max(x0Mm, x1Mm),
      z0Mm: Math.min(z0Mm, z1Mm),
      z1Mm: Math.max(z0Mm, z1Mm),
      projectionMm,
      swing,
    }),
  );
  if (!filled || features.length === 0) return [];
  const band = { z0Mm: run.z0Mm, z1Mm: run.z1Mm };
  const boxes = filled.placed.flatMap(({ id, leftMm, rightMm }) => {
    const unit = run.units.find((one) => one.id === id);
    if (!unit || unit.kind === 'open') return [];
    return [
      {
        ...band,
        unitId: id,
        name: unit.name,
        kind: unit.kind,
        x0Mm: leftMm,
        x1Mm: rightMm,
        depthMm: frontDepth(run),
        gableMm: WITHOUT_GABLES.includes(unit.kind) ? 0 : GABLE_MM,
      },
    ];
  });
  const [first, last] = [filled.placed[0], filled.placed.at(-1)];
  const fillers =
    first && last
      ? (['left', 'right'] as const).flatMap((end) => {
          const { face, isOpen } = filled[end];
          if (isOpen || face.value <= 0) return [];
          const [x0Mm, x1Mm] =
            end === 'left'
              ? [first.leftMm - face.value, first.leftMm]
              : [last.rightMm, last.rightMm + face.value];
          return [{ ...band, end, x0Mm, x1Mm }];
        })
      : [];
  return collisions(features, boxes, fillers).map((found) => asCollision(run.id, found));
}

function asCollision(runId: string, found: CollisionFound): Collision {
  const { words, unitId, readingId, what, overlapMm, xMm, zMm } = found;
  return { words, runId, unitId, readingId, what, overlapMm, xMm, zMm };
}
