/** Numbers in [0, 1) that look random and are the same for the same seed. */
export type Random = () => number;

/**
 * A generator of 32 bits of state. Source: mulberry32, T. Ettinger 2017, public domain; passes the small
 * test batteries, which is plenty for a search and no use for secrets.
 */
export function seededRandom(seed: number): Random {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), state | 1);
    mixed ^= mixed + Math.imul(mixed ^ (mixed >>> 7), mixed | 61);
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4_294_967_296;
  };
}
