import type { Database } from '@/db/database';
import type { ListRow } from '@/lib/contracts/job-lists';
import type { StartJobInput } from '@/lib/contracts/jobs';
import { guessColumns, type JobColumn } from '@/lib/import/job-columns';
import { readJobRow, rowProblemWords } from '@/lib/import/read-job-row';
import { plainCell } from '@/lib/import/read-value';
import type { Context } from '@/server/base/context';
import { addressKey, findDoubles } from './find-doubles';
import { type ParsedList, parseList } from './parse-list';

/** A row with the job that it begins, who is known of it, and which earlier row it repeats. */
export type ReadRow = ListRow & {
  job: StartJobInput | null;
  /** A customer of the shop, or the row of the list in which they stand first. */
  sameAs: { customerId: string } | { row: number } | null;
};
export type ReadList = Omit<ParsedList, 'rows'> & {
  columns: (JobColumn | null)[];
  samples: string[];
  rows: ReadRow[];
};

/** What a list says, row by row; nothing is written. */
export async function readList(
  db: Database,
  ctx: Context,
  { bytes, columns: chosen }: { bytes: Uint8Array; columns?: (JobColumn | null)[] | undefined },
): Promise<ReadList> {
  const { rows: parsed, ...list } = parseList(bytes);
  const guessed = guessColumns(list.headings);
  const columns = list.headings.map((_, index) =>
    chosen ? (chosen[index] ?? null) : (guessed[index] ?? null),
  );
  const read = parsed.map(({ row, cells }) => {
    const byColumn: Partial<Record<JobColumn, string>> = {};
    for (const [index, column] of columns.entries()) {
      if (column) byColumn[column] = cells[index] ?? '';
    }
    return { row, byColumn, ...readJobRow(byColumn, ctx.shop.region) };
  });
  const known = await findDoubles(
    db,
    ctx,
    read.map(({ job }) => job),
  );
  const earlier = new Map<string, number>();
  const rows = read.map(({ row, byColumn, job, problems }, index): ReadRow => {
    const double = known[index] ?? null;
    const before = job ? noteRow(earlier, job, row) : null;
    return {
      row,
      words: wordsOf(byColumn),
      problems: problems.map(rowProblemWords),
      double: double?.words ?? before?.words ?? '',
      job,
      sameAs: double?.customerId
        ? { customerId: double.customerId }
        : before?.isPerson
          ? { row: before.row }
          : null,
    };
  });
  const samples = columns.map((_, index) => {
    const filled = parsed.find(({ cells }) => (cells[index] ?? '').trim() !== '');
    return (filled?.cells[index] ?? '').trim().slice(0, 60);
  });
  return { ...list, columns, samples, rows };
}

/** Notes by what a row can be known again; gives the earlier row of the same phone, e-mail or address. */
function noteRow(earlier: Map<string, number>, { customer, site }: StartJobInput, row: number) {
  const keys: [string, string][] = [
    ['phone', customer.phone],
    ['e-mail', customer.email],
    ['address', addressKey(site)],
  ];
  const given = keys.filter(([, value]) => value !== '');
  const found = given.find(([what, value]) => earlier.has(`${what} ${value}`));
  for (const [what, value] of given) {
    if (!earlier.has(`${what} ${value}`)) earlier.set(`${what} ${value}`, row);
  }
  if (!found) return null;
  const [what, value] = found;
  const first = earlier.get(`${what} ${value}`) ?? row;
  return { row: first, words: `the ${what} of row ${first}`, isPerson: what !== 'address' };
}

function wordsOf(cells: Partial<Record<JobColumn, string>>): string {
  const { customer, street, town } = cells;
  return [customer, street, town]
    .map((cell) => plainCell(cell ?? ''))
    .filter(Boolean)
    .join(', ');
}
