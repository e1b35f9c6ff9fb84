import { LinkButton } from '@/components/ui/link-button';
import type { JobView } from '@/lib/contracts/jobs';
import { paths } from '@/lib/paths';
import type { Stage } from '@/lib/schedule/stages';

/** What a job of each stage is booked for next; the others need nothing booked. */
const next: Partial<Record<Stage, string>> = {
  enquiry: 'Book the site measure',
  'to-measure': 'Book the site measure',
  measured: 'Book the install',
  released: 'Book the install',
  'in-build': 'Book the install',
  ready: 'Book the install',
  snags: 'Book the return visit',
};

/** The one thing that most jobs wait for, from the job itself: times that work for it, in the diary. */
export function BookNext({ job }: { job: Pick<JobView, 'id' | 'stage' | 'nextVisit'> }) {
  const words = next[job.stage];
  if (!words || job.nextVisit) return null;
  return <LinkButton href={paths.diaryTimes(job.id)}>{words}</LinkButton>;
}
