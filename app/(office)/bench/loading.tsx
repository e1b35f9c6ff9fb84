import { SkeletonTable } from '@/components/ui/skeleton-table';

export default function BenchLoading() {
  return <SkeletonTable what="the bench" />;
}
