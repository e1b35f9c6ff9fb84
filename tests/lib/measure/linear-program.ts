/**
 * A linear program of few unknowns by looking at every vertex: slow and obvious. Least `goal · x` where
 * every constraint `row · x ≤ limit` holds; null where no vertex does.
 */
export type Constraint = { row: number[]; limit: number };

export function leastByVertices(goal: number[], constraints: Constraint[]): number | null {
  let least: number | null = null;
  for (const chosen of choices(constraints, goal.length)) {
    const x = solved(chosen);
    if (x === null) continue;
    const value = dot(goal, x);
    if (least !== null && value >= least) continue;
    if (constraints.every(({ row, limit }) => dot(row, x) <= limit + 1e-8)) least = value;
  }
  return least;
}

function* choices(all: Constraint[], count: number, from = 0): Generator<Constraint[]> {
  if (count === 0) {
    yield [];
    return;
  }
  for (let at = from; at <= all.length - count; at += 1) {
    for (const rest of choices(all, count - 1, at + 1)) yield [all[at]!, ...rest];
  }
}

function solved(chosen: Constraint[]): number[] | null {
  const size = chosen.length;
  const rows = chosen.map(({ row, limit }) => [...row, limit]);
  for (let at = 0; at < size; at += 1) {
    const pivot = rows
      .slice(at)
      .reduce((best, row) => (Math.abs(row[at]!) > Math.abs(best[at]!) ? row : best));
    if (Math.abs(pivot[at]!) < 1e-10) return null;
    rows.splice(rows.indexOf(pivot), 1);
    rows.splice(at, 0, pivot);
    for (const row of rows) {
      if (row === pivot) continue;
      const factor = row[at]! / pivot[at]!;
      for (let column = at; column <= size; column += 1) row[column]! -= factor * pivot[column]!;
    }
  }
  return rows.map((row, at) => row[size]! / row[at]!);
}

function dot(a: number[], b: number[]): number {
  return a.reduce((sum, value, at) => sum + value * b[at]!, 0);
}
