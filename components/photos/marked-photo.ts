import type { KeptPhoto } from '@/lib/photos/kept-photo';
import { markPath, markSizes, type PhotoMark } from '@/lib/photos/photo-marks';
import { type DrawingContext, drawnJpeg, openPicture } from './open-picture';

/** Readable on a white wall and in a dark cupboard: each line lies on a wider one of the other. */
export const markColours = { line: '#c8102e', under: '#ffffff' };

/** The picture with its marks drawn on it; null when it cannot be opened on this phone. */
export async function markedPhoto(photo: KeptPhoto): Promise<Blob | null> {
  const { clean, marks } = photo;
  if (!clean || marks.length === 0) return clean;
  const picture = await openPicture(clean);
  if (!picture) return null;
  const jpeg = await drawnJpeg(photo, (context) => {
    context.drawImage(picture, 0, 0, photo.widthPx, photo.heightPx);
    for (const mark of marks) drawMark(context, mark, photo);
  });
  picture.close();
  return jpeg;
}

function drawMark(
  context: DrawingContext,
  mark: PhotoMark,
  size: { widthPx: number; heightPx: number },
): void {
  const { linePx, wordsPx } = markSizes(size);
  context.lineJoin = 'round';
  context.lineCap = 'round';
  if (mark.kind === 'words') {
    const [x, y] = [mark.at.x * size.widthPx, mark.at.y * size.heightPx];
    context.font = `600 ${wordsPx}px "Work Sans", system-ui, sans-serif`;
    context.textAlign = 'center';
    context.textBaseline = 'middle';
    context.lineWidth = linePx * 2;
    context.strokeStyle = markColours.under;
    context.strokeText(mark.words, x, y);
    context.fillStyle = markColours.line;
    context.fillText(mark.words, x, y);
    return;
  }
  const path = new Path2D(markPath(mark, size));
  for (const [colour, width] of [
    [markColours.under, linePx * 2],
    [markColours.line, linePx],
  ] as const) {
    context.strokeStyle = colour;
    context.lineWidth = width;
    context.stroke(path);
  }
}
