import type { PhotoSize } from './photo-marks';

/** Enough to read a tape on a photo of a whole wall, and some 500 kB. */
export const LONGEST_SIDE_PX = 2_048;

/**
 * The size at which a photo is kept: its own, or as large as its longer side allows.
 * Example: 4032 × 3024 becomes 2048 × 1536.
 */
export function fitWithin(size: PhotoSize, longestPx: number): PhotoSize {
  const longer = Math.max(size.widthPx, size.heightPx);
  if (longer <= longestPx) return size;
  const scale = longestPx / longer;
  const scaled = (px: number) => Math.max(1, Math.round(px * scale));
  return { widthPx: scaled(size.widthPx), heightPx: scaled(size.heightPx) };
}
