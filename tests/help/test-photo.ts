/** 16 × 12 points, grey from light to dark: a whole baseline JPEG with nothing in it but the picture. */
const picture =
  '/9j/2wBDABQODxIPDRQSEBIXFRQYHjIhHhwcHj0sLiQySUBMS0dARkVQWnNiUFVtVkVGZIhlbXd7gYKBTmCNl4x9lnN+gXz/' +
  'wAALCAAMABABAREA/8QAFgABAQEAAAAAAAAAAAAAAAAAAAUG/8QAGRAAAQUAAAAAAAAAAAAAAAAAAAMUFVJi/9oACAEBAAA/' +
  'AKU5oTmjAu1rB2tY/9k=';

export const plainJpeg = (): Uint8Array => Uint8Array.from(Buffer.from(picture, 'base64'));

/** A segment of a JPEG: its marker, its length, its body. */
export function segment(code: number, body: Uint8Array | string): Uint8Array {
  const bytes = typeof body === 'string' ? Buffer.from(body, 'latin1') : body;
  const length = bytes.length + 2;
  return Uint8Array.from([0xff, code, length >> 8, length & 0xff, ...bytes]);
}

/** The picture with segments put in right after its start, as a camera does. */
export function withSegments(...segments: Uint8Array[]): Uint8Array {
  const [start, rest] = [plainJpeg().subarray(0, 2), plainJpeg().subarray(2)];
  return Uint8Array.from(Buffer.concat([start, ...segments, rest]));
}

/** What a camera writes: which way up, where in the world, and by whom. */
export function cameraExif(orientation: number): Uint8Array {
  const tiff = Buffer.alloc(60);
  tiff.write('II*\0', 0, 'latin1');
  tiff.writeUInt32LE(8, 4);
  tiff.writeUInt16LE(3, 8);
  const tag = (at: number, [name, type, count, value]: [number, number, number, number]) => {
    tiff.writeUInt16LE(name, at);
    tiff.writeUInt16LE(type, at + 2);
    tiff.writeUInt32LE(count, at + 4);
    tiff.writeUInt32LE(value, at + 8);
  };
  tag(10, [0x010f, 2, 4, 0x6d616300]);
  tag(22, [0x0112, 3, 1, orientation]);
  tag(34, [0x8825, 4, 1, 50]);
  tiff.write('12 Salt Row', 48, 'latin1');
  return segment(0xe1, Buffer.concat([Buffer.from('Exif\0\0', 'latin1'), tiff]));
}

/** The picture with its frame saying another size than it has. */
export function jpegOfSize(widthPx: number, heightPx: number): Uint8Array {
  const bytes = plainJpeg();
  const frame = Buffer.from(bytes).indexOf(Buffer.from([0xff, 0xc0]));
  bytes.set([heightPx >> 8, heightPx & 0xff, widthPx >> 8, widthPx & 0xff], frame + 5);
  return bytes;
}
