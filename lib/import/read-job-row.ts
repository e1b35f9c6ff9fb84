import { type StartJobInput, startJobInput } from '@/lib/contracts/jobs';
import { toE164 } from '@/lib/messages/phone-number';
import type { Region } from '@/lib/time/text-locale';
import { type JobColumn, jobColumnWords } from './job-columns';
import { plainCell, readDate, readLanguage, readNumber, readWalls, readYesNo } from './read-value';

export type RowProblem = { column: JobColumn; message: string };
export type JobRowRead = {
  /** Null while there is a problem. The phone is E.164. */
  job: StartJobInput | null;
  problems: RowProblem[];
};

/** A job of which a list says nothing else. */
export const untitledJob = 'New enquiry';

/**
 * One row of a list as the job that it begins, or what is wrong with it, column by column. Nobody is taken to
 * have agreed to be texted: a list is no proof of it.
 * Problems: what cannot be read, and what the form for a new job would refuse.
 */
export function readJobRow(cells: Partial<Record<JobColumn, string>>, region: Region): JobRowRead {
  const problems: RowProblem[] = [];
  const text = (column: JobColumn) => plainCell(cells[column] ?? '');
  const told = <T>(column: JobColumn, value: T | null, message: string, otherwise: T): T => {
    if (value === null) problems.push({ column, message: `${message}: "${text(column)}".` });
    return value ?? otherwise;
  };
  const number = (column: JobColumn) =>
    text(column) === '' ? null : told(column, readNumber(text(column)), 'This is no number', 0);

  const phone = text('phone') === '' ? null : toE164(text('phone'), region);
  if (phone && !phone.value) {
    const message = phone.problems[0]?.message ?? 'This is no phone number.';
    problems.push({ column: 'phone', message });
  }
  const read = {
    customer: {
      name: text('customer'),
      phone: phone?.value?.e164 ?? '',
      email: text('email').toLowerCase(),
      language: told('language', readLanguage(text('language')), 'Write English or Spanish', 'en'),
    },
    site: {
      street: text('street'),
      town: text('town'),
      postcode: text('postcode'),
      latitude: number('latitude'),
      longitude: number('longitude'),
      wayIn: text('wayIn'),
      floorsUp: number('floorsUp') ?? 0,
      hasLift: told('hasLift', readYesNo(text('hasLift')), 'Write yes or no', false),
      yearBuilt: number('yearBuilt'),
    },
    title: text('title') || untitledJob,
    roomCount: number('roomCount') ?? 1,
    unitCount: number('unitCount') ?? 0,
    wallsReady: told(
      'wallsReady',
      readWalls(text('wallsReady')),
      'Write closed, bare studs or not yet',
      'not-yet',
    ),
    siteReadyOn:
      text('siteReadyOn') === ''
        ? null
        : told('siteReadyOn', readDate(text('siteReadyOn'), region), 'This is no date', null),
    notes: text('notes'),
  };
  const parsed = startJobInput.safeParse(read);
  for (const issue of parsed.error?.issues ?? []) {
    const column = columnAt(issue.path);
    if (column && !problems.some((known) => known.column === column)) {
      problems.push({ column, message: issue.message });
    }
  }
  return { job: problems.length === 0 && parsed.success ? parsed.data : null, problems };
}

/** "Street: Give the street and number." */
export function rowProblemWords({ column, message }: RowProblem): string {
  return `${jobColumnWords[column]}: ${message}`;
}

const columnOfPath: Record<string, JobColumn> = { name: 'customer' };

function columnAt(path: readonly PropertyKey[]): JobColumn | null {
  const last = String(path.at(-1) ?? '');
  return columnOfPath[last] ?? ((last in jobColumnWords ? last : null) as JobColumn | null);
}
