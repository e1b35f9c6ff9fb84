import { newId } from '@/components/phone/new-id';
import { keepWork } from '@/components/phone/queue-store';
import type { Reading } from '@/lib/contracts/readings';
import type { PadHabits } from './pad-habits';

type Note = {
  personId: string;
  roomId: string;
  toolId: string;
  habits: Pick<PadHabits, 'unit' | 'touches'>;
  reason: string;
};

/** Notes that what was asked for could not be taken, and why. */
export function keepSkip({ slot, ...note }: Note & { slot: string }): Promise<void> {
  return keepNote(note, (common) => ({ ...common, kind: 'skip', slot, reason: note.reason }));
}

/** Takes a reading back; it stays in the book, marked. */
export function keepWithdrawal({
  readingId,
  ...note
}: Note & { readingId: string }): Promise<void> {
  return keepNote(note, (common) => ({
    ...common,
    kind: 'withdrawal',
    readingId,
    reason: note.reason,
  }));
}

function keepNote(
  { personId, roomId, toolId, habits }: Note,
  readingOf: (common: ReturnType<typeof commonOf>) => Reading,
): Promise<void> {
  const reading = readingOf(commonOf(roomId, toolId, habits));
  return keepWork(personId, [{ kind: 'reading', reading }]);
}

function commonOf(roomId: string, toolId: string, { unit, touches }: Note['habits']) {
  const takenAt = new Date().toISOString();
  return { id: newId(), roomId, toolId, takenAt, typed: '', unit, touches };
}
