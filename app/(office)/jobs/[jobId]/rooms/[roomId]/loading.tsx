import { Skeleton, SkeletonScreen } from '@/components/ui/skeleton';

/** The plan at the left, what the room says and the cut list at the right. */
export default function FitLoading() {
  return (
    <SkeletonScreen what="the fit">
      <Skeleton className="h-8 w-72" />
      <div className="mt-4 grid gap-x-10 gap-y-6 xl:grid-cols-[minmax(0,1fr)_27rem]">
        <Skeleton className="h-140 w-full" />
        <div className="flex flex-col gap-3">
          {['w-full', 'w-5/6', 'w-11/12', 'w-3/4', 'w-4/5', 'w-2/3'].map((width) => (
            <Skeleton key={width} className={`h-5 ${width}`} />
          ))}
        </div>
      </div>
    </SkeletonScreen>
  );
}
