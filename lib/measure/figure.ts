/** One figure of a fit: the value and how sure it is. Lengths in mm, angles in degrees. */
export type Figure = {
  value: number;
  /** Standard uncertainty. */
  u: number;
  /** Expanded uncertainty, k = 2. */
  U: number;
  /** Ids of the readings that govern it. */
  from: string[];
};

/** `U = 2u` (JCGM 100:2008, 6.2.1, k = 2). */
export function figure(value: number, u: number, from: string[]): Figure {
  return { value, u, U: 2 * u, from };
}
