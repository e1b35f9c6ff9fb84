import { QueueStatus } from '@/components/phone/queue-status';
import { PhoneShell } from '@/components/shell/phone-shell';
import type { WallBookView } from '@/lib/contracts/rooms';
import { RoomWhere } from './room-where';
import { WallBookScreen } from './wall-book-screen';

/** One room's wall book, under the strip. */
export function RoomScreen({ view, isStale }: { view: WallBookView; isStale?: boolean }) {
  return (
    <PhoneShell where={<RoomWhere view={view} />} status={<QueueStatus isInRoom />}>
      <WallBookScreen view={view} isStale={isStale} />
    </PhoneShell>
  );
}
