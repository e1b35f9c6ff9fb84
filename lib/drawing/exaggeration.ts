/** Deviations are drawn this many times larger, so that a hand's width of paper shows a millimetre. */
const steps = [20, 10, 5, 2, 1] as const;

/**
 * The greatest exaggeration at which every deviation keeps inside what the drawing has room for.
 *
 * Edge: nothing to show gives the greatest; what does not fit even unexaggerated is drawn as it is.
 * Example: a bow of 7 mm with room for 100 mm is drawn ×10; 30° of room for a corner 1.3° out gives ×20.
 */
export function exaggerationFor(deviations: readonly { size: number; room: number }[]): number {
  return (
    steps.find((step) => deviations.every(({ size, room }) => Math.abs(size) * step <= room)) ?? 1
  );
}

const largeSteps = [500, 200, 100, 50, ...steps] as const;

/**
 * The greatest of 500, 200, 100 … 1 at which one size keeps inside its room.
 *
 * Edge: nothing to enlarge, or what does not fit even as it is, gives 1.
 * Example: an ellipse of 2.4 mm with room for 260 mm is drawn ×100.
 */
export function largestWithin(size: number, room: number): number {
  if (!(size > 0)) return 1;
  return largeSteps.find((step) => size * step <= room) ?? 1;
}
