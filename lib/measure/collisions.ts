/** What is on the wall and stands in the way of a unit: outlets in gables, trim under uppers, swings. */
import { bothUnits } from '@/lib/units/both-units';

/** A rectangle on the wall: x along it, z up, mm. */
export type WallPatch = { x0Mm: number; x1Mm: number; z0Mm: number; z1Mm: number };

export type WallFeature = WallPatch & {
  readingId: string;
  kind:
    | 'window'
    | 'door'
    | 'opening'
    | 'outlet'
    | 'switch'
    | 'water'
    | 'waste'
    | 'gas'
    | 'vent'
    | 'radiator'
    | 'panel'
    | 'beam'
    | 'pipe'
    | 'other';
  /** How far it stands out of the wall. */
  projectionMm: number;
  swing: 'none' | 'in-left' | 'in-right' | 'out-left' | 'out-right';
};

export type BoxOnWall = WallPatch & {
  unitId: string;
  name: string;
  /** Drawer boxes fill the whole inside; a corner unit and an appliance are boxes like any other. */
  kind: string;
  /** Out of the wall, to the door fronts. */
  depthMm: number;
  /** Thickness of its gables; 0 where it has none (an appliance, an opening). */
  gableMm: number;
};
/** A filler, taken as solid over its height. */
export type FillerOnWall = WallPatch & { end: 'left' | 'right' };

export type CollisionFound = {
  readingId: string;
  unitId: string | null;
  what:
    | 'in-gable'
    | 'in-filler'
    | 'in-drawers'
    | 'covered'
    | 'trim-under-unit'
    | 'swing-meets-unit';
  /** The smaller of the overlaps along x and z (for a swing: in plan). */
  overlapMm: number;
  xMm: number;
  zMm: number;
  words: string;
};

/** Behind an open unit these may stay: they are cut in or reached through the back. */
const SERVICES: readonly WallFeature['kind'][] = [
  'outlet',
  'switch',
  'water',
  'waste',
  'gas',
  'pipe',
  'vent',
];
const NAMES: Record<WallFeature['kind'], string> = {
  window: 'window',
  door: 'door',
  opening: 'opening',
  outlet: 'outlet',
  switch: 'switch',
  water: 'water',
  waste: 'waste',
  gas: 'gas',
  vent: 'vent',
  radiator: 'radiator',
  panel: 'panel',
  beam: 'beam',
  pipe: 'pipe',
  other: 'something on the wall',
};

/**
 * Every feature of a wall that a unit or filler of a run meets, with the overlap.
 *
 * Services collide with gables, fillers and drawer boxes, switches and vents with any box over them, every
 * other feature with any box. A casement or door that swings in meets boxes that its leaf can reach,
 * opened right back.
 * Frame: x along the wall, z up, y out of it; mm. Edge: what merely touches does not collide.
 * Example: an outlet from 590 to 660 and a gable from 582 to 600: 10 mm in the gable.
 * Problems: none (features with impossible sizes are left out by their own checks).
 * Source: common practice, no source.
 */
export function collisions(
  features: WallFeature[],
  boxes: BoxOnWall[],
  fillers: FillerOnWall[],
): CollisionFound[] {
  return features.flatMap((feature) => [
    ...boxes.flatMap((box) => withBox(feature, box)),
    ...fillers.flatMap((filler) => withFiller(feature, filler)),
  ]);
}

function withBox(feature: WallFeature, box: BoxOnWall): CollisionFound[] {
  if (SERVICES.includes(feature.kind)) return withService(feature, box);
  const over = overlap(feature, box);
  if (over) {
    const what =
      feature.kind === 'window' || feature.kind === 'door' ? 'trim-under-unit' : 'covered';
    return [
      found(feature, box, what, over, `${nameOf(box)} stands over the ${NAMES[feature.kind]}`),
    ];
  }
  const swung = swingOverlap(feature, box);
  if (!swung) return [];
  const words = `The ${NAMES[feature.kind]} swings against ${nameOf(box)}`;
  return [found(feature, box, 'swing-meets-unit', swung, words)];
}

function withService(feature: WallFeature, box: BoxOnWall): CollisionFound[] {
  const inside = overlap(feature, box);
  if (!inside) return [];
  const gables = [
    { ...box, x1Mm: box.x0Mm + box.gableMm },
    { ...box, x0Mm: box.x1Mm - box.gableMm },
  ];
  for (const gable of gables) {
    const over = overlap(feature, gable);
    const words = `The ${NAMES[feature.kind]} is in the gable of ${nameOf(box)}`;
    if (over) return [found(feature, box, 'in-gable', over, words)];
  }
  if (box.kind === 'drawers') {
    const words = `The ${NAMES[feature.kind]} is behind the drawers of ${nameOf(box)}`;
    return [found(feature, box, 'in-drawers', inside, words)];
  }
  if (feature.kind === 'switch' || feature.kind === 'vent') {
    const words = `The ${NAMES[feature.kind]} is covered by ${nameOf(box)}`;
    return [found(feature, box, 'covered', inside, words)];
  }
  return [];
}

function withFiller(feature: WallFeature, filler: FillerOnWall): CollisionFound[] {
  const over = overlap(feature, filler);
  if (!over) return [];
  const words = `The ${NAMES[feature.kind]} is in the ${filler.end} filler`;
  return [found(feature, null, 'in-filler', over, words)];
}

type Overlap = { sizeMm: number; xMm: number; zMm: number };

function overlap(one: WallPatch, other: WallPatch): Overlap | null {
  const x0 = Math.max(one.x0Mm, other.x0Mm);
  const x1 = Math.min(one.x1Mm, other.x1Mm);
  const z0 = Math.max(one.z0Mm, other.z0Mm);
  const z1 = Math.min(one.z1Mm, other.z1Mm);
  if (x1 - x0 <= 1e-6 || z1 - z0 <= 1e-6) return null;
  return { sizeMm: Math.min(x1 - x0, z1 - z0), xMm: (x0 + x1) / 2, zMm: (z0 + z1) / 2 };
}

/**
 * A leaf hinged at one side of its opening sweeps half a turn in plan: the quarter in front of the opening
 * and, opened right back, the quarter beside its hinge.
 */
function swingOverlap(feature: WallFeature, box: BoxOnWall): Overlap | null {
  if (feature.swing !== 'in-left' && feature.swing !== 'in-right') return null;
  const z0 = Math.max(feature.z0Mm, box.z0Mm);
  const z1 = Math.min(feature.z1Mm, box.z1Mm);
  if (z1 - z0 <= 1e-6) return null;
  const radius = feature.x1Mm - feature.x0Mm;
  const hinge = feature.swing === 'in-left' ? feature.x0Mm : feature.x1Mm;
  const nearest = Math.min(Math.max(hinge, box.x0Mm), box.x1Mm);
  const reach = radius - Math.abs(nearest - hinge);
  if (reach <= 1e-6) return null;
  return { sizeMm: Math.min(reach, box.depthMm), xMm: nearest, zMm: (z0 + z1) / 2 };
}

function found(
  feature: WallFeature,
  box: BoxOnWall | null,
  what: CollisionFound['what'],
  over: Overlap,
  words: string,
): CollisionFound {
  return {
    readingId: feature.readingId,
    unitId: box?.unitId ?? null,
    what,
    overlapMm: over.sizeMm,
    xMm: over.xMm,
    zMm: over.zMm,
    words: `${words} by ${bothUnits(over.sizeMm)}.`,
  };
}

const nameOf = (box: BoxOnWall) => box.name || `a ${box.kind} unit`;
