/** Reads a calendar file by the letter of RFC 5545, and says what is against it. */

export type CalendarLine = { name: string; params: string; value: string };

/** Unfolded content lines (3.1), with everything that is wrong with the file. */
export function readCalendar(file: string): { lines: CalendarLine[]; wrong: string[] } {
  const wrong: string[] = [];
  if (/(^|[^\r])\n/.test(file)) wrong.push('3.1: a line ends without CR');
  for (const line of file.split('\r\n')) {
    if (Buffer.byteLength(line) > 75) wrong.push(`3.1: over 75 octets: ${line}`);
    if (Buffer.from(line).toString('utf8').includes('\uFFFD')) wrong.push('3.1: a torn letter');
  }
  const lines = file
    .replace(/\r\n[ \t]/g, '')
    .split('\r\n')
    .filter(Boolean)
    .map((line) => {
      const [, name = '', params = '', value = ''] =
        /^([A-Z-]+)((?:;[A-Z-]+=(?:"[^"]*"|[^":;,]*)(?:,(?:"[^"]*"|[^":;,]*))*)*):(.*)$/s.exec(
          line,
        ) ?? [];
      if (!name) wrong.push(`3.1: no content line: ${line}`);
      return { name, params, value };
    });
  const all = (name: string) => lines.filter((line) => line.name === name);
  const has = (name: string, section: string) => {
    if (all(name).length !== 1) wrong.push(`${section}: ${name} ${all(name).length} times`);
  };
  has('VERSION', '3.6');
  has('PRODID', '3.6');
  has('UID', '3.6.1');
  has('DTSTAMP', '3.6.1');
  has('DTSTART', '3.6.1');
  if (!/^\d{8}T\d{6}Z$/.test(all('DTSTAMP')[0]?.value ?? '')) wrong.push('3.8.7.2: not UTC');
  if (all('DTSTART')[0]?.params.includes('TZID') && all('TZID').length === 0) {
    wrong.push('3.6.5: a zone without its VTIMEZONE');
  }
  return { lines, wrong: [...wrong, ...wrongByMethod(lines)] };
}

/** RFC 5546, 3.2: what each method must and must not carry. */
function wrongByMethod(lines: CalendarLine[]): string[] {
  const value = (name: string) => lines.find((line) => line.name === name)?.value;
  const method = value('METHOD');
  const wrong: string[] = [];
  if (value('ORGANIZER') === undefined) wrong.push(`3.2: ${method} without ORGANIZER`);
  if (method === 'PUBLISH' && value('ATTENDEE') !== undefined) wrong.push('3.2.1: ATTENDEE');
  if (method === 'REQUEST' && value('ATTENDEE') === undefined) wrong.push('3.2.2: no ATTENDEE');
  if (method === 'CANCEL' && value('STATUS') !== 'CANCELLED') wrong.push('3.2.5: STATUS');
  if (!/^\d+$/.test(value('SEQUENCE') ?? '')) wrong.push('3.2: SEQUENCE');
  return wrong;
}
