import type { SheetView } from '@/lib/contracts/rooms';
import type { Run } from '@/lib/contracts/runs';
import type { PlacedUnit } from '@/lib/measure/run-fit';
import { unitWords } from '@/lib/sheet/unit-words';
import { formatLength } from '@/lib/units/format-length';
import { type TrueLayer, type TruePoint, type TrueShape, trueWords } from './true-shape';

/** Narrower boxes are panels; words on them would run over their neighbours. */
const leastWidthMm = 150;

/** What is written on a box: its name over its width. */
export function unitLabel(
  { rules }: Pick<SheetView, 'rules'>,
  run: Run,
  {
    unit: { unitId, leftMm, rightMm },
    at,
    layer,
  }: { unit: PlacedUnit; at: TruePoint; layer: TrueLayer },
): TrueShape[] {
  const unit = run.units.find(({ id }) => id === unitId);
  if (!unit || rightMm - leftMm < leastWidthMm) return [];
  const look = { layer, anchor: 'middle' } as const;
  return [
    trueWords([at[0], at[1] + 15], unitWords(unit, rules.region), look),
    trueWords([at[0], at[1] - 55], formatLength(rightMm - leftMm, rules), look),
  ];
}
