/** A picture as it is to be seen, whichever way up the phone was held; null when this phone cannot open it. */
export async function openPicture(file: Blob): Promise<ImageBitmap | null> {
  try {
    return await createImageBitmap(file, { imageOrientation: 'from-image' });
  } catch {
    return null;
  }
}

/** Draws on a canvas of that size and gives it as a JPEG; nothing of what the camera wrote is in it. */
export async function drawnJpeg(
  { widthPx, heightPx }: { widthPx: number; heightPx: number },
  draw: (context: CanvasRenderingContext2D) => void,
): Promise<Blob | null> {
  const canvas = document.createElement('canvas');
  canvas.width = widthPx;
  canvas.height = heightPx;
  const context = canvas.getContext('2d');
  if (!context) return null;
  draw(context);
  const jpeg = await new Promise<Blob | null>((resolve) =>
    canvas.toBlob(resolve, 'image/jpeg', 0.86),
  );
  // Some phones hold a canvas's memory until it is small.
  canvas.width = 0;
  return jpeg;
}
