/** Which way up a photo was taken, the one thing worth keeping of what a camera writes into it. */

const ORIENTATION_TAG = 0x0112;
const MOST_TAGS = 500;

/**
 * The orientation (1 to 8; 1: as it stands) in the body of an Exif segment, `Exif\0\0` included.
 *
 * Edge: anything that is not understood is 1.
 * Source: CIPA DC-008 (Exif), 4.5.2 and 4.6.4; TIFF 6.0, section 2.
 */
export function orientationOf(body: Uint8Array): number {
  if (!isExif(body)) return 1;
  const view = new DataView(body.buffer, body.byteOffset + 6, body.byteLength - 6);
  if (view.byteLength < 14) return 1;
  const order = view.getUint16(0);
  if (order !== 0x4949 && order !== 0x4d4d) return 1;
  const isLittle = order === 0x4949;
  const start = view.getUint32(4, isLittle);
  if (start + 2 > view.byteLength) return 1;
  const tags = Math.min(view.getUint16(start, isLittle), MOST_TAGS);
  for (let tag = 0; tag < tags; tag += 1) {
    const at = start + 2 + tag * 12;
    if (at + 12 > view.byteLength) return 1;
    if (view.getUint16(at, isLittle) !== ORIENTATION_TAG) continue;
    const value = view.getUint16(at + 8, isLittle);
    return value >= 1 && value <= 8 ? value : 1;
  }
  return 1;
}

export function isExif(body: Uint8Array): boolean {
  return String.fromCharCode(...body.subarray(0, 6)) === 'Exif\0\0';
}

/** A whole Exif segment that says the orientation and nothing else. */
export function orientationSegment(orientation: number): Uint8Array {
  return Uint8Array.from([
    ...[0xff, 0xe1, 0x00, 0x22],
    ...[0x45, 0x78, 0x69, 0x66, 0x00, 0x00],
    // TIFF, big-endian; its one directory at 8 holds one tag: a short, once.
    ...[0x4d, 0x4d, 0x00, 0x2a, 0x00, 0x00, 0x00, 0x08, 0x00, 0x01],
    ...[0x01, 0x12, 0x00, 0x03, 0x00, 0x00, 0x00, 0x01, 0x00, orientation, 0x00, 0x00],
    ...[0x00, 0x00, 0x00, 0x00],
  ]);
}
