import { inStore } from '@/components/phone/phone-database';
import { isWaiting, type KeptMark, type KeptPhoto, outlivedPhotos } from '@/lib/photos/kept-photo';

/** Puts a photo on the phone's disk. When it has resolved, the photo cannot be lost but with the phone. */
export async function keepPhoto(photo: KeptPhoto): Promise<void> {
  await inStore(({ photos }) => photos.add(photo));
}

export async function readPhoto(photoId: string): Promise<KeptPhoto | null> {
  return (await inStore(({ photos }) => photos.get(photoId))) ?? null;
}

/** Of a room, in the order in which they were taken. */
export function readPhotosOfRoom(roomId: string): Promise<KeptPhoto[]> {
  return inStore(({ photos }) => photos.where('roomId').equals(roomId).sortBy('takenAt'));
}

export function readPhotos(): Promise<KeptPhoto[]> {
  return inStore(({ photos }) => photos.toArray());
}

/** Each mark as it is made; a photo that has gone out is changed no more. */
export async function keepMarks(photoId: string, marks: KeptMark[]): Promise<void> {
  await change(photoId, { marks, marked: null });
}

/** Done with it: from here it is sent. */
export async function finishPhoto(photoId: string, marked: Blob | null): Promise<void> {
  await change(photoId, { marked, isDone: true });
}

/** Taken by mistake. Only what has not gone out can be thrown away. */
export async function dropPhoto(photoId: string): Promise<void> {
  await inStore(({ photos }) =>
    photos
      .where('id')
      .equals(photoId)
      .and(({ sentAt }) => sentAt === null)
      .delete(),
  );
}

/** The office has it: the picture without marks is let go. */
export async function markPhotoSent(photoId: string, sentAt: string): Promise<void> {
  await inStore(({ photos }) => photos.update(photoId, { sentAt, clean: null, parked: null }));
}

export async function parkPhoto(photoId: string, words: string): Promise<void> {
  await inStore(({ photos }) => photos.update(photoId, { parked: words }));
}

export async function tryParkedPhotosAgain(personId: string): Promise<void> {
  await inStore(({ photos }) =>
    photos
      .filter((photo) => photo.personId === personId && photo.parked !== null)
      .modify({ parked: null }),
  );
}

export async function dropOutlivedPhotos(nowMs: number): Promise<void> {
  await inStore(async ({ photos }) =>
    photos.bulkDelete(outlivedPhotos(await photos.toArray(), nowMs)),
  );
}

async function change(photoId: string, part: Partial<KeptPhoto>): Promise<void> {
  await inStore(({ photos }) =>
    photos
      .where('id')
      .equals(photoId)
      .and((photo) => isWaiting(photo) || photo.parked !== null)
      .modify(part),
  );
}
