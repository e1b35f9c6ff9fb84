import type { Unit, UnitKind } from '@/lib/contracts/wall-book';

/** One word for each kind of unit. */
export const unitKindWords: Record<UnitKind, string> = {
  base: 'Base',
  drawers: 'Drawers',
  sink: 'Sink',
  corner: 'Corner',
  wall: 'Wall unit',
  tall: 'Tall unit',
  panel: 'End panel',
  dishwasher: 'Dishwasher',
  range: 'Range',
  refrigerator: 'Refrigerator',
  hood: 'Hood',
  open: 'Open',
};

/** The unit's own name, else its kind. */
export function unitWords(unit: Pick<Unit, 'name' | 'kind'>): string {
  return unit.name || unitKindWords[unit.kind];
}
