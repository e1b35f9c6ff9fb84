/** What a file is by its first bytes; its name and the type that its sender claims count for nothing. */
export type PictureKind =
  | 'jpeg'
  | 'png'
  | 'gif'
  | 'webp'
  | 'heic'
  | 'svg'
  | 'pdf'
  | 'zip'
  | 'unknown';

const beginnings: [start: string, kind: PictureKind][] = [
  ['\xff\xd8\xff', 'jpeg'],
  ['\x89PNG\r\n\x1a\n', 'png'],
  ['GIF87a', 'gif'],
  ['GIF89a', 'gif'],
  ['%PDF-', 'pdf'],
  ['PK\x03\x04', 'zip'],
];

/**
 * Example: `FF D8 FF` begins a JPEG.
 * Edge: text that mentions `<svg` near its start is an SVG, whatever stands before it.
 */
export function pictureKind(bytes: Uint8Array): PictureKind {
  const head = String.fromCharCode(...bytes.subarray(0, 16));
  const known = beginnings.find(([start]) => head.startsWith(start));
  if (known) return known[1];
  if (head.startsWith('RIFF') && head.slice(8, 12) === 'WEBP') return 'webp';
  if (/^(?:hei|hev|mif1|msf1|avi)/.test(head.slice(8)) && head.slice(4, 8) === 'ftyp')
    return 'heic';
  return /<svg\b/i.test(new TextDecoder().decode(bytes.subarray(0, 4096))) ? 'svg' : 'unknown';
}
