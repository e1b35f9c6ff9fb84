import { SkeletonTable } from '@/components/ui/skeleton-table';

export default function SnagsLoading() {
  return <SkeletonTable what="the snags" />;
}
