import type { PhotoMark, PhotoSize } from './photo-marks';

/** A mark by a name of its own. */
export type KeptMark = PhotoMark & { id: string };

/** A photo on the phone: as it was taken, its marks, and the picture that is sent, with the marks on it. */
export type KeptPhoto = PhotoSize & {
  /** Made on the phone; the office keeps it under the same. */
  id: string;
  personId: string;
  /** Null where no room is drawn: then the job is named. */
  roomId: string | null;
  jobId?: string;
  wallId: string | null;
  takenAt: string;
  /** Where it was taken, "Wall B". */
  place: string;
  /** Without marks; let go when the photo is sent. */
  clean: Blob | null;
  marks: KeptMark[];
  /** With the marks; null until they are done. */
  marked: Blob | null;
  /** The measurer is done with it; one that was left half marked goes out after a while all the same. */
  isDone: boolean;
  /** The office has it since; null while it waits. */
  sentAt: string | null;
  /** Why the office would not take it. */
  parked: string | null;
};

/** Left alone so long, a photo that was being marked is done: the page was closed over it. */
const LEFT_ALONE_MS = 15 * 60_000;
/** A sent photo is shown from the phone for the rest of the day and the next. */
const SHOWN_MS = 36 * 3_600_000;

/**
 * The photo to send next: the oldest that waits, or null.
 * Edge: another person's waits for that person; what the office refused is passed over.
 */
export function nextPhoto(
  photos: readonly KeptPhoto[],
  { personId, nowMs }: { personId: string; nowMs: number },
): KeptPhoto | null {
  const waiting = photos.filter(
    (photo) =>
      photo.personId === personId &&
      isWaiting(photo) &&
      (photo.isDone || nowMs - Date.parse(photo.takenAt) >= LEFT_ALONE_MS),
  );
  return waiting.sort((one, other) => (one.takenAt < other.takenAt ? -1 : 1))[0] ?? null;
}

/** Not with the office yet, and not refused by it. */
export function isWaiting({ sentAt, parked }: Pick<KeptPhoto, 'sentAt' | 'parked'>): boolean {
  return sentAt === null && parked === null;
}

/** Photos that the office has had long enough for the phone to let go of. */
export function outlivedPhotos(photos: readonly KeptPhoto[], nowMs: number): string[] {
  return photos
    .filter(({ sentAt }) => sentAt !== null && nowMs - Date.parse(sentAt) > SHOWN_MS)
    .map(({ id }) => id);
}
