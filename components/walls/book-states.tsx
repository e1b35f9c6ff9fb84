import { EmptyState } from '@/components/ui/empty-state';
import { Skeleton, SkeletonScreen } from '@/components/ui/skeleton';
import { PlaceButton } from './place-button';

/** The shape of a screen whose code or plan is on its way. */
export function Waiting() {
  return (
    <SkeletonScreen what="what is to be read">
      <div className="flex flex-col gap-3 p-3.5">
        <Skeleton className="h-44 w-full" />
        <Skeleton className="h-6 w-3/4" />
        <Skeleton className="h-12 w-1/2" />
      </div>
    </SkeletonScreen>
  );
}

/** Nothing is open: what to do next. */
export function AllRead() {
  return (
    <div className="p-3.5">
      <EmptyState
        title="Nothing more is asked for"
        action={
          <div className="flex w-full flex-col gap-2">
            <PlaceButton place={{ at: 'leave' }}>Before you leave</PlaceButton>
            <PlaceButton look="line" place={{ at: 'list' }}>
              The whole room
            </PlaceButton>
          </div>
        }
      >
        Look once at what holds together and what does not, then hand the book in.
      </EmptyState>
    </div>
  );
}
