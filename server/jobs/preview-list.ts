import type { ListPreview, PreviewListInput } from '@/lib/contracts/job-lists';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { readList } from './read-list';

/** What a list would bring, and what is wrong with it, before anything is written. */
export async function previewList(
  ctx: PersonContext,
  input: PreviewListInput & { bytes: Uint8Array },
): Promise<ListPreview> {
  mustBeAllowed(ctx, 'jobs:change');
  const { rows, ...list } = await readList(ctx.db, ctx, input);
  const has = (test: (row: (typeof rows)[number]) => boolean) => rows.filter(test).length;
  return {
    ...list,
    rows: rows.map(({ row, words, problems, double }) => ({ row, words, problems, double })),
    counts: {
      ready: has(({ job, double }) => job !== null && double === ''),
      problems: has(({ problems }) => problems.length > 0),
      doubles: has(({ job, double }) => job !== null && double !== ''),
    },
  };
}
