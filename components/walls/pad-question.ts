import type { Reading } from '@/lib/contracts/readings';
import type { Room } from '@/lib/contracts/wall-book';
import type { PlannedReading } from '@/lib/measure/missing-reading';
import { cornerName, walkRoom } from '@/lib/measure/room-walk';
import { askOfReading } from '@/lib/walls-pad/ask-of-reading';
import type { PadAsk } from '@/lib/walls-pad/pad-fields';
import { readingWords } from '@/lib/walls-pad/reading-words';
import { type LengthSpeech, sayLength } from '@/lib/walls-pad/say-length';

/** One screen of the pad. */
export type PadQuestion = {
  /** Names it, for what is half typed. */
  key: string;
  title: string;
  why: string;
  ask: PadAsk;
  /** Nobody asked for it: where it is taken is typed as well. */
  isFree: boolean;
  /** The planned reading it answers; null when nobody asked. */
  slot: string | null;
  /** The reading that it corrects. */
  corrects: Reading | null;
};

export function questionOfPlan({ slot, words, why, ask }: PlannedReading): PadQuestion | null {
  if (ask.kind === 'feature') return null;
  return { key: slot, title: words, why, ask, isFree: false, slot, corrects: null };
}

export function questionOfReading(
  reading: Reading,
  room: Room,
  speech: LengthSpeech,
): PadQuestion | null {
  const ask = askOfReading(reading, room);
  if (!ask) return null;
  const { what, value } = readingWords(reading, room, speech);
  return {
    key: `correct:${reading.id}`,
    title: what,
    why: `It reads ${value}. The first stays in the book, marked as corrected.`,
    ask,
    isFree: false,
    slot: null,
    corrects: reading,
  };
}

const diagonalSlot = /^diagonal:([^:]+):([^:]+):(\d+(?:\.\d+)?)$/;

/** A diagonal that would settle the room though the plan does not ask for it, by its slot. */
export function questionOfDiagonal(slot: string, room: Room): PadQuestion | null {
  const [, fromCornerWallId = '', toCornerWallId = '', zMm] = diagonalSlot.exec(slot) ?? [];
  const walls = walkRoom(room).byId;
  const [from, to] = [walls.get(fromCornerWallId), walls.get(toCornerWallId)];
  if (!from?.before || !to?.before) return null;
  return {
    key: slot,
    title: `Diagonal, ${cornerName(from)} to ${cornerName(to)}`,
    why: 'It settles which of the readings is wrong.',
    ask: { kind: 'diagonal', fromCornerWallId, toCornerWallId, zMm: Number(zMm) },
    isFree: false,
    slot: null,
    corrects: null,
  };
}

/** The same thing once more, to settle what disagrees; the reading before stands beside it. */
export function questionAgain(
  reading: Reading,
  room: Room,
  speech: LengthSpeech,
): PadQuestion | null {
  const ask = askOfReading(reading, room);
  if (!ask) return null;
  const { what, value } = readingWords(reading, room, speech);
  return {
    key: `again:${reading.id}`,
    title: `${what}: once more`,
    why: `It read ${value}. Measure it afresh, as if you had not.`,
    ask,
    isFree: false,
    slot: null,
    corrects: null,
  };
}

export const freeKinds = [
  'length',
  'pieces',
  'corner',
  'face',
  'floor',
  'ceiling',
  'stud',
  'doorway',
] as const;
export type FreeKind = (typeof freeKinds)[number];

/** A reading that nobody asked for, on a wall that was picked. */
export function freeQuestion(
  kind: FreeKind,
  wallId: string,
  room: Room,
  { counterMm, speech }: { counterMm: number; speech: LengthSpeech },
): PadQuestion | null {
  const walked = walkRoom(room).byId.get(wallId);
  if (kind !== 'doorway' && !walked) return null;
  const name = walked?.wall.name ?? '';
  const base = {
    key: `free:${kind}:${wallId}`,
    why: 'Along from the left corner, up from the floor.',
    isFree: true,
    slot: null,
    corrects: null,
  };
  const zMm = counterMm;
  const place = { wallId, xMm: 0 };
  switch (kind) {
    case 'length':
      return {
        ...base,
        title: `Wall ${name}, length`,
        ask: { kind, wallId, zMm, yMm: 0, nominalMm: walked?.wall.nominalLengthMm ?? 0 },
      };
    case 'pieces':
      return {
        ...base,
        title: `Wall ${name}, in pieces`,
        why: 'Up from the floor; then corner to mark, mark to mark, mark to corner.',
        ask: {
          kind,
          wallId,
          zMm,
          nominalMm: walked?.wall.nominalLengthMm ?? 0,
          stretches: ['piece to the mark', 'piece from the mark'],
        },
      };
    case 'corner': {
      if (!walked?.before) return null;
      const nominalDeg = walked.leftCornerDeg ?? 90;
      const legMm = 0;
      return {
        ...base,
        title: `Corner ${walked.before.name}–${name}`,
        ask: { kind, cornerWallId: wallId, zMm, nominalDeg, legMm, carriedPast: nominalDeg > 180 },
      };
    }
    case 'face':
      return {
        ...base,
        title: `Wall ${name}, gap to the line`,
        ask: {
          kind,
          ...place,
          zMm,
          setUpKind: 'plumb-level',
          setUpGroup: `face:${wallId}`,
          setUpId: null,
        },
      };
    case 'floor':
    case 'ceiling':
      return {
        ...base,
        title: `${kind === 'floor' ? 'Floor' : 'Ceiling'} along wall ${name}`,
        ask: { kind, ...place, yMm: 0, setUpGroup: 'level', setUpId: null },
      };
    case 'stud':
      return { ...base, title: `Wall ${name}, a stud`, ask: { kind, wallId, nth: 1 } };
    case 'doorway':
      return {
        ...base,
        title: 'A doorway on the way in',
        why: `Clear of leaf and stop, to ${sayLength(speech.stepMm, speech)}.`,
        ask: { kind },
      };
  }
}
