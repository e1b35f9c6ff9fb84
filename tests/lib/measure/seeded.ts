/** Numbers that look random and are the same each run (mulberry32). */
export function seeded(seed: number) {
  let state = seed >>> 0;
  const uniform = () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 4294967296;
  };
  const between = (least: number, most: number) => least + uniform() * (most - least);
  const normal = () => Math.sqrt(-2 * Math.log(1 - uniform())) * Math.cos(2 * Math.PI * uniform());
  return { uniform, between, normal };
}

/** Mean and standard deviation of a figure whose readings are drawn again and again (JCGM 101). */
export function monteCarlo(runs: number, draw: () => number): { mean: number; sd: number } {
  const values = Array.from({ length: runs }, draw);
  const mean = values.reduce((sum, value) => sum + value, 0) / runs;
  const sd = Math.sqrt(values.reduce((sum, value) => sum + (value - mean) ** 2, 0) / (runs - 1));
  return { mean, sd };
}
