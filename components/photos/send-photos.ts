import type { AddPhotoInput } from '@/lib/contracts/files';
import { apiPaths } from '@/lib/paths';
import { type KeptPhoto, nextPhoto } from '@/lib/photos/kept-photo';
import { captionOf } from '@/lib/photos/photo-marks';
import type { Answer, Settled } from '@/lib/sync/settle-batch';
import { settlePhoto } from '@/lib/sync/settle-photo';
import { markedPhoto } from './marked-photo';
import {
  dropOutlivedPhotos,
  finishPhoto,
  markPhotoSent,
  parkPhoto,
  readPhotos,
} from './photo-store';

/** Some photos are large and some signals are weak. */
const PATIENCE_MS = 180_000;

/**
 * Sends the oldest photo that waits, and says what to do before the next request; 'nothing' when none
 * waits. One at a time, and only when no reading waits: photos hold up none.
 */
export async function sendOnePhoto(personId: string): Promise<Settled['next'] | 'nothing'> {
  const photo = nextPhoto(await readPhotos(), { personId, nowMs: Date.now() });
  if (!photo) {
    await dropOutlivedPhotos(Date.now());
    return 'nothing';
  }
  // Left half marked when the page was closed: its marks are drawn now.
  const picture = photo.marked ?? (await markedPhoto(photo));
  if (!picture) {
    await parkPhoto(photo.id, 'This phone cannot open the photo any more. Take it again.');
    return 'go-on';
  }
  if (!photo.marked) await finishPhoto(photo.id, picture);
  const settled = settlePhoto(photo.id, await post(photo, picture));
  if (settled.isTaken) await markPhotoSent(photo.id, new Date().toISOString());
  else if (settled.parked !== null) await parkPhoto(photo.id, settled.parked);
  return settled.next;
}

async function post(photo: KeptPhoto, picture: Blob): Promise<Answer> {
  const { id: fileId, roomId, jobId = '', wallId, takenAt, place, marks } = photo;
  const said: AddPhotoInput = {
    fileId,
    ...(roomId === null ? { jobId } : { roomId }),
    takenAt,
    caption: captionOf(place, marks),
    ...(wallId === null ? {} : { wallId }),
  };
  try {
    const response = await fetch(`${apiPaths.files()}?${new URLSearchParams(said)}`, {
      method: 'POST',
      headers: { 'content-type': 'image/jpeg' },
      body: picture,
      redirect: 'manual',
      signal: AbortSignal.timeout(PATIENCE_MS),
    });
    if (response.type === 'opaqueredirect') return 'no-answer';
    const isJson = /\bjson\b/.test(response.headers.get('content-type') ?? '');
    return { status: response.status, json: isJson ? await response.json() : null };
  } catch {
    return 'no-answer';
  }
}
