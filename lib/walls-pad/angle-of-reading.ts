import type { ReadingOf } from '@/lib/contracts/readings';
import type { Tool } from '@/lib/contracts/wall-book';
import { cornerAngle } from '@/lib/measure/corner';
import type { Figure } from '@/lib/measure/figure';
import { angleUncertainty, lengthUncertainty } from '@/lib/measure/uncertainty';
import type { Outcome } from '@/lib/problem';

/** The angle of a corner reading with what its tool is sure to; what cannot be is a problem in words. */
export function angleOfReading({ id, by }: ReadingOf<'corner'>, tool: Tool): Outcome<Figure> {
  if (by.method === 'angle') {
    const u = angleUncertainty(tool);
    return cornerAngle({ method: 'angle', angle: { id, value: by.angleDeg, u } });
  }
  const uOfLength = (lengthMm: number) => lengthUncertainty(tool, lengthMm, 0);
  const read = (value: number) => ({ id, value, u: uOfLength(value) });
  return cornerAngle({
    method: 'legs',
    legLeft: read(by.legLeftMm),
    legRight: read(by.legRightMm),
    diagonal: read(by.diagonalMm),
    carriedPast: by.carriedPast,
    uOfLength,
  });
}
