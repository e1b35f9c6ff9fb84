import { CsvError, parse } from 'csv-parse/sync';
import { mostListColumns, mostListRows } from '@/lib/contracts/job-lists';
import { decodeText } from '@/lib/import/decode-text';
import { findSeparator } from '@/lib/import/find-separator';
import { Refusal } from '@/server/base/problem-response';

export type ParsedList = {
  encoding: string;
  separator: string;
  headings: string[];
  rows: { row: number; cells: string[] }[];
};

/** The bytes of a list as headings and rows; what is no list is refused, with what to do. */
export function parseList(bytes: Uint8Array): ParsedList {
  const { text, encoding } = decodeText(bytes);
  if (text.includes('\0')) {
    throw notAList('This is no text. Save the sheet as CSV, and give that file.');
  }
  const separator = findSeparator(text);
  const [headings, ...rows] = readRecords(text, separator);
  if (!headings || rows.length === 0) {
    throw notAList('There is nothing under the headings. The first row names the columns.');
  }
  if (rows.length > mostListRows) {
    throw notAList(`That is ${rows.length} rows. Take ${mostListRows} at a time.`);
  }
  if (headings.length > mostListColumns) {
    throw notAList(`That is ${headings.length} columns. Take ${mostListColumns} at most.`);
  }
  return {
    encoding,
    separator,
    headings: headings.map((heading) => heading.trim()),
    rows: rows.map((cells, index) => ({ row: index + 2, cells })),
  };
}

function readRecords(text: string, separator: string): string[][] {
  try {
    return parse(text, {
      bom: true,
      delimiter: separator,
      relax_column_count: true,
      relax_quotes: true,
      skip_empty_lines: true,
      skip_records_with_empty_values: true,
    });
  } catch (error) {
    if (!(error instanceof CsvError)) throw error;
    throw notAList('The quotes in the file do not close. Save the sheet as CSV once more.');
  }
}

function notAList(message: string): Refusal {
  return new Refusal({
    status: 422,
    code: 'not-a-list',
    message: `Nothing was read. ${message}`,
  });
}
