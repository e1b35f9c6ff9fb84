import { Skeleton, SkeletonScreen } from '@/components/ui/skeleton';

/** While a screen of the day is fetched. */
export function OpeningStop() {
  return (
    <SkeletonScreen what="the stop">
      <div className="flex flex-col gap-3 p-3.5">
        <Skeleton className="h-8 w-2/3" />
        <Skeleton className="h-16 w-full" />
        <Skeleton className="h-16 w-full" />
      </div>
    </SkeletonScreen>
  );
}
