import type { JobRow } from '@/lib/contracts/jobs';
import type { Stage } from '@/lib/schedule';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { listJobs } from '@/server/jobs/list-jobs';

/** Between the measure and the install: only then does a late bench move anything. */
const stagesAtTheBench: ReadonlySet<Stage> = new Set([
  'measured',
  'released',
  'in-build',
  'ready',
  'installing',
  'snags',
]);

/** Jobs that the shop can be late with: those with something booked first. */
export async function listLateJobs(ctx: PersonContext): Promise<JobRow[]> {
  mustBeAllowed(ctx, 'visits:book');
  const rows = await listJobs(ctx, { search: '' });
  return rows
    .filter(({ stage }) => stagesAtTheBench.has(stage))
    .sort((a, b) => Number(b.nextVisit !== null) - Number(a.nextVisit !== null));
}
