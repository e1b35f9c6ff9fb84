import { readPhoto } from '@/components/photos/photo-store';

/** A photo that was thrown away on its own screen belongs to nothing. */
export async function stillHere(photoIds: readonly string[]): Promise<string[]> {
  const found = await Promise.all(
    photoIds.map(async (photoId) =>
      (await readPhoto(photoId).catch(() => null)) ? photoId : null,
    ),
  );
  return found.flatMap((photoId) => photoId ?? []);
}
