import { type Outcome, problem, refused } from '@/lib/problem';
import { orientationOf, orientationSegment } from './jpeg-orientation';

export type CleanJpeg = { bytes: Uint8Array; widthPx: number; heightPx: number };

/** A side, and all points: what a browser can hold open without dying of it. */
export const MOST_SIDE_PX = 12_000;
export const MOST_POINTS = 50_000_000;
/** Passes over the picture; each costs a whole decoding, cameras write about ten. */
const MOST_SCANS = 60;

const SOI = 0xd8;
const EOI = 0xd9;
const SOS = 0xda;
/** Tables that a decoder needs: quantisation, Huffman, restart interval. */
const TABLES = new Set([0xdb, 0xc4, 0xdd]);
/** Baseline, extended, progressive: the frames that browsers draw. */
const FRAMES = new Set([0xc0, 0xc1, 0xc2]);
const OTHER_FRAMES = new Set([0xc3, 0xc5, 0xc6, 0xc7, 0xc9, 0xca, 0xcb, 0xcd, 0xce, 0xcf]);

/**
 * A JPEG again with nothing in it but the picture: frame, tables and scans are copied, and of what a camera
 * adds (place, time, owner, thumbnails, comments) only which way up it was held.
 *
 * Edge: pictures that follow the first (a camera's multi-picture file) are cut off; anything else behind
 * the end is refused, as is a picture cut short or too large to open.
 * Example: a photo with its place and a comment comes back without both, the picture bit for bit.
 * Problems: photo-broken, photo-too-large, photo-not-shown, photo-carries-more.
 * Source: ITU-T T.81, annex B.
 */
export function cleanJpeg(bytes: Uint8Array): Outcome<CleanJpeg> {
  if (bytes[0] !== 0xff || bytes[1] !== SOI) return broken();
  const kept: Uint8Array[] = [];
  let size: { widthPx: number; heightPx: number } | null = null;
  let orientation = 1;
  let scans = 0;
  let at = 2;
  for (;;) {
    const marker = markerAt(bytes, at);
    if (!marker) return broken();
    const { code, next } = marker;
    if (code === EOI) {
      if (!size || scans === 0) return broken();
      if (!isHarmlessTail(bytes.subarray(next))) return carriesMore();
      return { value: { ...size, bytes: whole(kept, orientation) }, problems: [] };
    }
    const length = ((bytes[next] ?? 0) << 8) | (bytes[next + 1] ?? 0);
    const end = next + length;
    if (length < 2 || end > bytes.length) return broken();
    const body = bytes.subarray(next + 2, end);
    const segment = bytes.subarray(next - 2, end);
    if (OTHER_FRAMES.has(code)) return notShown();
    if (FRAMES.has(code)) {
      if (size || body.length < 6) return broken();
      size = sizeOf(body);
      if (size.widthPx === 0 || size.heightPx === 0) return broken();
      if (isTooLarge(size)) return tooLarge(size);
      kept.push(segment);
    } else if (code === SOS) {
      scans += 1;
      if (!size) return broken();
      if (scans > MOST_SCANS) return notShown();
      const scanEnd = endOfScan(bytes, end);
      kept.push(bytes.subarray(next - 2, scanEnd));
      at = scanEnd;
      continue;
    } else if (TABLES.has(code) || isAdobe(code, body)) {
      kept.push(segment);
    } else if (code === 0xe1 && orientation === 1) {
      orientation = orientationOf(body);
    } else if (!isDropped(code)) {
      return broken();
    }
    at = end;
  }
}

/** The marker that must stand here, past its fill bytes; null where there is none. */
function markerAt(bytes: Uint8Array, at: number): { code: number; next: number } | null {
  if (bytes[at] !== 0xff) return null;
  let place = at + 1;
  while (bytes[place] === 0xff) place += 1;
  const code = bytes[place];
  return code === undefined || code === 0 ? null : { code, next: place + 1 };
}

/** Scan data run on to the first marker that is neither a stuffed byte nor a restart. */
function endOfScan(bytes: Uint8Array, start: number): number {
  let at = start;
  for (;;) {
    at = bytes.indexOf(0xff, at);
    if (at < 0 || at + 1 >= bytes.length) return bytes.length;
    const code = bytes[at + 1] ?? 0;
    if (code !== 0 && code !== 0xff && (code < 0xd0 || code > 0xd7)) return at;
    at += code === 0xff ? 1 : 2;
  }
}

function sizeOf(body: Uint8Array): { widthPx: number; heightPx: number } {
  const [, h1 = 0, h0 = 0, w1 = 0, w0 = 0] = body;
  return { widthPx: (w1 << 8) | w0, heightPx: (h1 << 8) | h0 };
}

function isTooLarge({ widthPx, heightPx }: { widthPx: number; heightPx: number }): boolean {
  return Math.max(widthPx, heightPx) > MOST_SIDE_PX || widthPx * heightPx > MOST_POINTS;
}

/** Says how the colours are stored; without it some pictures come out in wrong ones. */
function isAdobe(code: number, body: Uint8Array): boolean {
  return (
    code === 0xee && body.length === 12 && String.fromCharCode(...body.subarray(0, 5)) === 'Adobe'
  );
}

/** Application data and comments. */
function isDropped(code: number): boolean {
  return (code >= 0xe0 && code <= 0xef) || code === 0xfe;
}

/** Padding, or a further picture of the same shot. */
function isHarmlessTail(tail: Uint8Array): boolean {
  const start = tail.findIndex((byte) => byte !== 0);
  return start < 0 || (tail[start] === 0xff && tail[start + 1] === SOI && tail[start + 2] === 0xff);
}

function whole(kept: Uint8Array[], orientation: number): Uint8Array {
  const parts = [
    Uint8Array.of(0xff, SOI),
    ...(orientation === 1 ? [] : [orientationSegment(orientation)]),
    ...kept,
    Uint8Array.of(0xff, EOI),
  ];
  const bytes = new Uint8Array(parts.reduce((sum, part) => sum + part.length, 0));
  let at = 0;
  for (const part of parts) {
    bytes.set(part, at);
    at += part.length;
  }
  return bytes;
}

const broken = () =>
  refused(problem('photo-broken', 'This photo is damaged or cut short. Take it again.'));
const notShown = () =>
  refused(
    problem('photo-not-shown', 'This is a kind of JPEG that browsers do not show. Take it again.'),
  );
const carriesMore = () =>
  refused(
    problem(
      'photo-carries-more',
      'Something else is hidden behind this picture, so it is not kept.',
    ),
  );
const tooLarge = ({ widthPx, heightPx }: { widthPx: number; heightPx: number }) =>
  refused(
    problem(
      'photo-too-large',
      `This picture is ${widthPx} × ${heightPx} points; the most is ${MOST_SIDE_PX} a side and ${MOST_POINTS / 1e6} million in all.`,
    ),
  );
