/** Reads comma-separated text by the letter of RFC 4180; throws on what it does not allow. */
export function readStrictCsv(text: string): string[][] {
  const rows: string[][] = [];
  let at = 0;
  while (at < text.length) {
    const row: string[] = [];
    for (;;) {
      const [cell, next] = text[at] === '"' ? quoted(text, at) : plain(text, at);
      row.push(cell);
      at = next;
      if (text[at] !== ',') break;
      at += 1;
    }
    if (text.slice(at, at + 2) !== '\r\n') throw new Error(`no CR LF at ${at}`);
    at += 2;
    rows.push(row);
  }
  if (rows.some((row) => row.length !== rows[0]?.length)) throw new Error('rows differ in length');
  return rows;
}

function quoted(text: string, start: number): [string, number] {
  let cell = '';
  for (let at = start + 1; at < text.length; at += 1) {
    if (text[at] !== '"') cell += text[at];
    else if (text[at + 1] === '"') {
      cell += '"';
      at += 1;
    } else return [cell, at + 1];
  }
  throw new Error(`the quotes of ${start} are not closed`);
}

function plain(text: string, start: number): [string, number] {
  const [cell = ''] = text.slice(start).match(/^[^,\r\n"]*/) ?? [];
  return [cell, start + cell.length];
}
