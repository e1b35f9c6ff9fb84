import { SkeletonTable } from '@/components/ui/skeleton-table';

export default function JobsLoading() {
  return <SkeletonTable what="the jobs" />;
}
