import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import type { VisitOutside } from '@/lib/contracts/crews';
import { OutsideList } from './outside-list';

type AskOutsideProps = {
  outside: VisitOutside[] | null;
  isBusy: boolean;
  onKeep: () => void;
  onLetBe: () => void;
};

/** Before a change is kept that leaves visits outside: they are named, and not moved. */
export function AskOutside({ outside, isBusy, onKeep, onLetBe }: AskOutsideProps) {
  const count = outside?.length ?? 0;
  return (
    <Dialog
      isOpen={outside !== null}
      onClose={onLetBe}
      title={count === 1 ? 'One visit would stand outside' : `${count} visits would stand outside`}
      footer={
        <>
          <Button onClick={onKeep} busyText={isBusy ? 'Saving…' : undefined}>
            Save all the same
          </Button>
          <Button look="line" onClick={onLetBe}>
            Leave it as it was
          </Button>
        </>
      }
    >
      <p>They stay where they are, and nobody is told, until you move them in the diary.</p>
      <OutsideList visits={outside ?? []} />
    </Dialog>
  );
}
