/** A walk along walls seen from above, clockwise: x to the right, y down the sheet, headings grow clockwise. */
export type WalkStep = {
  lengthMm: number /** Interior angle at this wall's left corner. */;
  cornerDeg: number;
};
export type PlanPoint = { xMm: number; yMm: number };

/**
 * Where each wall begins, and last where the walk ends. The first wall runs along the heading given.
 *
 * Edge: the first corner's angle turns nothing, the heading is given.
 * Example: 3000, then 2000 after a 90° corner: (0,0), (3000,0), (3000,2000).
 * Source: heading[i] = heading[i−1] + 180 − angle[i] (MEASURE "Frames and signs").
 */
export function walk(steps: WalkStep[], headingDeg = 0): PlanPoint[] {
  let heading = headingDeg;
  let here: PlanPoint = { xMm: 0, yMm: 0 };
  const points = [here];
  steps.forEach(({ lengthMm, cornerDeg }, at) => {
    if (at > 0) heading += 180 - cornerDeg;
    const radians = (heading * Math.PI) / 180;
    here = {
      xMm: here.xMm + lengthMm * Math.cos(radians),
      yMm: here.yMm + lengthMm * Math.sin(radians),
    };
    points.push(here);
  });
  return points;
}
