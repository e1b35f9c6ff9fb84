export type Separator = ',' | ';' | '\t';

const candidates: readonly Separator[] = [',', ';', '\t'];
const linesLookedAt = 20;

/**
 * What stands between the columns: the mark that divides the first lines into the most columns, all alike.
 * What stands in quotes divides nothing. A list of one column has a comma.
 * Example: `Name;Phone` with `"Ada, Bo";555` below is divided by the semicolon.
 */
export function findSeparator(text: string): Separator {
  const lines = linesOf(text).slice(0, linesLookedAt);
  const scored = candidates.map((separator) => {
    const counts = lines.map((line) => line.filter((mark) => mark === separator).length);
    const inHeader = counts[0] ?? 0;
    const alike = counts.filter((count) => count === inHeader).length;
    return { separator, score: inHeader === 0 ? 0 : inHeader * (alike / counts.length) };
  });
  return scored.reduce((best, next) => (next.score > best.score ? next : best)).separator;
}

/** The characters of each line that stand outside quotes, and the quotes. */
function linesOf(text: string): string[][] {
  const lines: string[][] = [[]];
  let isQuoted = false;
  for (const mark of text) {
    if (mark === '"') {
      isQuoted = !isQuoted;
      lines.at(-1)?.push(mark);
    } else if (!isQuoted && mark === '\n') {
      if (lines.length > linesLookedAt) break;
      lines.push([]);
    } else if (!isQuoted) lines.at(-1)?.push(mark);
  }
  return lines.filter((line) => line.some((mark) => mark.trim() !== ''));
}
