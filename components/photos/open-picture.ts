/** A picture as it is to be seen, whichever way up the phone was held; null when this phone cannot open it. */
export async function openPicture(file: Blob): Promise<ImageBitmap | null> {
  try {
    return await createImageBitmap(file, { imageOrientation: 'from-image' });
  } catch {
    return null;
  }
}

/** Letters on a tape stay sharp; a photo of a wall is some 500 kB. */
const QUALITY = 0.86;

export type DrawingContext = CanvasRenderingContext2D | OffscreenCanvasRenderingContext2D;

/** Draws on a canvas of that size and gives it as a JPEG; nothing of what the camera wrote is in it. */
export async function drawnJpeg(
  { widthPx, heightPx }: { widthPx: number; heightPx: number },
  draw: (context: DrawingContext) => void,
): Promise<Blob | null> {
  // The worker has this one alone, and a page need not hold it in its tree.
  if (typeof OffscreenCanvas !== 'undefined') {
    const off = new OffscreenCanvas(widthPx, heightPx);
    const offContext = off.getContext('2d');
    if (!offContext) return null;
    draw(offContext);
    return off.convertToBlob({ type: 'image/jpeg', quality: QUALITY });
  }
  const canvas = document.createElement('canvas');
  canvas.width = widthPx;
  canvas.height = heightPx;
  const context = canvas.getContext('2d');
  if (!context) return null;
  draw(context);
  const jpeg = await new Promise<Blob | null>((resolve) =>
    canvas.toBlob(resolve, 'image/jpeg', QUALITY),
  );
  // Some phones hold a canvas's memory until it is small.
  canvas.width = 0;
  return jpeg;
}
