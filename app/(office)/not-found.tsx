import { NothingHere } from '@/components/shell/nothing-here';
import { paths } from '@/lib/paths';

/** Beside the office's own pages, which stay in reach. */
export default function OfficeNotFound() {
  return <NothingHere href={paths.jobs()} word="To the jobs" />;
}
