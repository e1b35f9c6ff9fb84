export type CsvCell = string | number | null;

/** A spreadsheet takes what begins so for a formula and runs it. */
const formulaStart = /^[=+\-@\t\r\n＝＋－＠]/;
/** With its sign and nothing else it can only be a number: a phone, a longitude. */
const plainNumber = /^[+-]\d+(?:\.\d+)?$/;
const needsQuotes = /[",\r\n]|^\s|\s$/;
/** Says to spreadsheets that the text is UTF-8; without it "A–B" comes out as "Aâ€“B". */
const byteOrderMark = '\uFEFF';

/**
 * Rows as comma-separated text: RFC 4180, every line ended by CR LF, in UTF-8 with its mark.
 *
 * Edge: text that a spreadsheet would run as a formula is given an apostrophe in front, a signed number (a
 * phone, a longitude) is not; numbers stay numbers, to 1e-4, and what is no finite number is left empty.
 * Example: [['Filler, left', 63.5]] gives `"Filler, left",63.5`.
 * Problems: none. Source: RFC 4180; OWASP, CSV injection.
 */
export function csvText(rows: readonly (readonly CsvCell[])[]): string {
  return byteOrderMark + rows.map((row) => `${row.map(cellText).join(',')}\r\n`).join('');
}

function cellText(cell: CsvCell): string {
  if (cell === null) return '';
  if (typeof cell === 'number') return numberText(cell);
  const isFormula = formulaStart.test(cell) && !plainNumber.test(cell);
  const safe = isFormula ? `'${cell}` : cell;
  return needsQuotes.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}

function numberText(value: number): string {
  if (!Number.isFinite(value)) return '';
  return String(Math.round(value * 10_000) / 10_000 || 0);
}
