import { usePersonId } from '@/components/phone/phone-person';
import type { Reading } from '@/lib/contracts/readings';
import type { WallBookView } from '@/lib/contracts/rooms';
import { type OtherReader, otherReaders } from '@/lib/walls-pad/other-readers';
import type { LengthSpeech } from '@/lib/walls-pad/say-length';

/** Asks of a reading what other people read there. */
export function useOtherReaders(
  view: WallBookView,
  speech: LengthSpeech,
): (reading: Reading) => OtherReader[] {
  const ownPersonId = usePersonId();
  const { wallBook: book, readers, rules } = view;
  // With one reader there is nobody else; most rooms have one.
  if (readers.every(({ personId }) => personId === ownPersonId)) return () => [];
  return (reading) => otherReaders(reading, { book, readers, ownPersonId, rules, speech });
}
