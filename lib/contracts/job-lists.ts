/** Lists of customers and jobs, in and out. */
import { z } from 'zod';
import { type JobColumn, jobColumns } from '@/lib/import/job-columns';

export const mostListBytes = 2_000_000;
export const mostListRows = 2_000;
export const mostListColumns = 100;

const yesNo = z.enum(['yes', 'no']).default('no');

/** "customer,phone,,street": which column each heading is, in the order of the list; nothing is left out. */
const columns = z
  .string()
  .max(3_000)
  .transform((text) => text.split(','))
  .pipe(z.array(z.union([z.enum(jobColumns), z.literal('')])).max(mostListColumns))
  .transform((names) => names.map((name): JobColumn | null => name || null))
  .refine(
    (names) => {
      const used = names.filter((name) => name !== null);
      return new Set(used).size === used.length;
    },
    { message: 'Two columns are the same thing. Leave one of them out.' },
  );

/** The file is the body; what is said of it stands in the address. */
export const previewListInput = z.object({ columns: columns.optional() });
export type PreviewListInput = z.infer<typeof previewListInput>;

export const importListInput = z.object({
  idempotencyKey: z.uuid(),
  columns,
  /** What is as it should be comes in; what is not stays out. Else one bad row keeps all of them out. */
  leaveOutProblems: yesNo,
  /** Rows of customers who are known already begin one more job of theirs. */
  takeDoubles: yesNo,
});
export type ImportListInput = z.infer<typeof importListInput>;

export const listRow = z.object({
  /** As the spreadsheet numbers it; the headings are row 1. */
  row: z.number().int(),
  /** "Robin Testwood, 12 Alder Row, Fernhollow". */
  words: z.string(),
  problems: z.array(z.string()),
  /** "the phone of Robin Testwood, job 12"; empty when nobody alike is known. */
  double: z.string(),
});
export type ListRow = z.infer<typeof listRow>;

export const listPreview = z.object({
  encoding: z.string(),
  separator: z.string(),
  headings: z.array(z.string()),
  /** In the order of the headings. */
  columns: z.array(z.enum(jobColumns).nullable()),
  /** The first cells under each heading, to see what it is. */
  samples: z.array(z.string()),
  rows: z.array(listRow),
  counts: z.object({ ready: z.number(), problems: z.number(), doubles: z.number() }),
});
export type ListPreview = z.infer<typeof listPreview>;

export const importedList = z.object({ jobs: z.number().int(), leftOut: z.number().int() });
export type ImportedList = z.infer<typeof importedList>;
