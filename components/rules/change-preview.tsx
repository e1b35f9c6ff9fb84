import Link from 'next/link';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import type { RulePreview } from '@/lib/contracts/rule-changes';
import { paths } from '@/lib/paths';
import { ChangeTable } from './change-table';

type ChangePreviewProps = {
  preview: RulePreview;
  isBusy: boolean;
  onSave: () => void;
  onClose: () => void;
};

/** What a change of the rules would do, before it does it. */
export function ChangePreview({ preview, isBusy, onSave, onClose }: ChangePreviewProps) {
  const { changes, rooms, roomsLookedAt, releasedSheets } = preview;
  return (
    <Dialog
      isOpen
      onClose={onClose}
      title="What this changes"
      className="max-w-3xl"
      footer={
        <Button onClick={onSave} busyText={isBusy ? 'Saving…' : undefined}>
          Save the rules
        </Button>
      }
    >
      <ChangeTable changes={changes} />
      {roomsLookedAt > 0 ? (
        <p>
          {rooms.length === 0
            ? `The ${roomsLookedAt} newest rooms that are not released come out as before.`
            : `Of the ${roomsLookedAt} newest rooms that are not released, ${rooms.length} come out otherwise:`}
        </p>
      ) : null}
      <ul>
        {rooms.map((room) => (
          <li key={room.roomId} className="border-b border-rule py-1.5">
            <Link className="link" href={paths.room(room.jobId, room.roomId)} target="_blank">
              {room.words}
            </Link>
            <div className="text-graphite">
              {room.from} → <span className="text-ink">{room.to}</span>
            </div>
          </li>
        ))}
      </ul>
      <p className="text-graphite">
        {releasedSheets === 1
          ? 'The released sheet stays'
          : `${releasedSheets} released sheets stay`}{' '}
        as {releasedSheets === 1 ? 'it is' : 'they are'}.
      </p>
    </Dialog>
  );
}
