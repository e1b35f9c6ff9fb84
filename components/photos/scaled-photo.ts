import { fitWithin, LONGEST_SIDE_PX } from '@/lib/photos/fit-within';
import type { PhotoSize } from '@/lib/photos/photo-marks';
import { drawnJpeg, openPicture } from './open-picture';

/** What the camera gave, no larger than is needed to read a tape on it; null when it cannot be opened here. */
export async function scaledPhoto(file: Blob): Promise<(PhotoSize & { clean: Blob }) | null> {
  const picture = await openPicture(file);
  if (!picture) return null;
  const own = { widthPx: picture.width, heightPx: picture.height };
  const size = fitWithin(own, LONGEST_SIDE_PX);
  const clean = await drawnJpeg(size, (context) =>
    context.drawImage(picture, 0, 0, size.widthPx, size.heightPx),
  );
  picture.close();
  return clean ? { ...size, clean } : null;
}
