import { QueueStatus } from '@/components/phone/queue-status';
import { PhoneShell } from '@/components/shell/phone-shell';
import { Skeleton, SkeletonScreen } from '@/components/ui/skeleton';

export default function PhoneLoading() {
  return (
    <PhoneShell where={<b>Setwell</b>} status={<QueueStatus />}>
      <SkeletonScreen what="the page">
        <div className="flex flex-col gap-4 px-3.5 py-4">
          <Skeleton className="h-8 w-2/3" />
          <Skeleton className="h-20 w-full" />
          <Skeleton className="h-20 w-full" />
          <Skeleton className="h-20 w-full" />
        </div>
      </SkeletonScreen>
    </PhoneShell>
  );
}
