import { readPhotos } from '@/components/photos/photo-store';
import { readQueue } from './queue-store';

/** Whose, and whether the office refused it: all that the strip counts. */
export type Unsent = { personId: string; parked: string | null };

/** Everything on this phone that the office has not got: readings, drawings, taps, photos. */
export async function readUnsent(): Promise<Unsent[]> {
  const photos = await readPhotos();
  return [...(await readQueue()), ...photos.filter(({ sentAt }) => sentAt === null)];
}
