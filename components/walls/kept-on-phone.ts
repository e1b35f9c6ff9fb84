import { readDraft } from '@/components/phone/draft-store';
import type { WallBookView } from '@/lib/contracts/rooms';
import type { PadDraft } from '@/lib/walls-pad/pad-draft';
import { afterKey, draftKey, habitsKey, sketchKey } from './draft-keys';
import { freshHabits, type PadHabits } from './pad-habits';
import type { SketchDraft } from './sketch-draft';

/** What was left half done on this phone. */
export type KeptOnPhone = {
  habits: PadHabits;
  draft: PadDraft | null;
  sketch: SketchDraft | null;
  /** The question answered last: the next follows it. */
  afterSlot: string | null;
};

export async function readKept({ rules, wallBook }: WallBookView): Promise<KeptOnPhone> {
  const roomId = wallBook.room.id;
  const [habits, draft, sketch, afterSlot] = await Promise.all([
    readDraft<PadHabits>(habitsKey),
    readDraft<PadDraft>(draftKey(roomId)),
    readDraft<SketchDraft>(sketchKey(roomId)),
    readDraft<string>(afterKey(roomId)),
  ]);
  return { habits: { ...freshHabits(rules.unit), ...habits }, draft, sketch, afterSlot };
}
