import { Buffer } from 'node:buffer';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { cleanJpeg } from '@/lib/files/clean-jpeg';
import { pictureKind } from '@/lib/files/picture-kind';
import { cameraExif, jpegOfSize, plainJpeg, segment, withSegments } from '../../help/test-photo';

const textOf = (bytes: Uint8Array) => Buffer.from(bytes).toString('latin1');
const codeOf = (bytes: Uint8Array) => cleanJpeg(bytes).problems[0]?.code ?? null;

describe('a photo cleaned of everything but the picture', () => {
  it('comes back as it was when there is nothing else in it', () => {
    const { value } = cleanJpeg(plainJpeg());
    expect(value).toMatchObject({ widthPx: 16, heightPx: 12 });
    expect([...(value?.bytes ?? [])]).toEqual([...plainJpeg()]);
  });

  it('loses place, maker, comments, profiles and thumbnails', () => {
    const photo = withSegments(
      segment(0xe0, 'JFIF\0\x01\x01\x00\x00\x01\x00\x01\x00\x00'),
      cameraExif(1),
      segment(0xe1, 'http://ns.adobe.com/xap/1.0/\0<x:xmpmeta>owner</x:xmpmeta>'),
      segment(0xed, 'Photoshop 3.0'),
      segment(0xfe, 'taken at 12 Salt Row'),
    );
    const { value } = cleanJpeg(photo);
    expect([...(value?.bytes ?? [])]).toEqual([...plainJpeg()]);
  });

  it('keeps which way up it was held, and no more of what the camera wrote', () => {
    const { value } = cleanJpeg(withSegments(cameraExif(6)));
    const bytes = value?.bytes ?? new Uint8Array();
    expect(textOf(bytes)).not.toContain('Salt Row');
    expect(bytes.length).toBe(plainJpeg().length + 36);
    // Read back by the same rule that a browser has: the tag's value is 6.
    expect(textOf(bytes.subarray(2, 12))).toBe('\xff\xe1\x00\x22Exif\0\0');
    expect([...bytes.subarray(22, 32)]).toEqual([0x01, 0x12, 0, 3, 0, 0, 0, 1, 0, 6]);
  });

  it('keeps how the colours are stored', () => {
    const adobe = segment(0xee, 'Adobe\0\x64\0\0\0\0\x01');
    expect(cleanJpeg(withSegments(adobe)).value?.bytes.length).toBe(
      plainJpeg().length + adobe.length,
    );
    expect(cleanJpeg(withSegments(segment(0xee, 'Adobe and more'))).value?.bytes.length).toBe(
      plainJpeg().length,
    );
  });

  it('cuts off padding and the further pictures of one shot', () => {
    const shot = Buffer.concat([plainJpeg(), Buffer.alloc(7), plainJpeg()]);
    expect(cleanJpeg(shot).value?.bytes.length).toBe(plainJpeg().length);
  });

  it.each([
    ['an archive behind the picture', Buffer.concat([plainJpeg(), Buffer.from('PK\x03\x04rest')])],
    ['a page behind the picture', Buffer.concat([plainJpeg(), Buffer.from('<script>')])],
  ])('refuses %s', (_what, bytes) => {
    expect(codeOf(bytes)).toBe('photo-carries-more');
  });

  it.each([
    [12_001, 10],
    [9_000, 9_000],
    [65_535, 65_535],
  ])('refuses a picture of %d × %d points before anybody opens it', (width, height) => {
    expect(codeOf(jpegOfSize(width, height))).toBe('photo-too-large');
  });

  it('refuses kinds that browsers do not draw, and pictures of endless passes', () => {
    const arithmetic = plainJpeg();
    arithmetic[Buffer.from(arithmetic).indexOf(Buffer.from([0xff, 0xc0])) + 1] = 0xc9;
    expect(codeOf(arithmetic)).toBe('photo-not-shown');
    const bytes = Buffer.from(plainJpeg());
    const scan = bytes.subarray(bytes.indexOf(Buffer.from([0xff, 0xda])), -2);
    const endless = [bytes.subarray(0, -2), ...Array(80).fill(scan), bytes.subarray(-2)];
    expect(codeOf(Buffer.concat(endless))).toBe('photo-not-shown');
  });

  it('refuses what is cut short anywhere, and never throws', () => {
    const whole = withSegments(cameraExif(6));
    for (let end = 0; end < whole.length; end += 1) {
      expect(codeOf(whole.subarray(0, end))).toBe('photo-broken');
    }
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 300 }), fc.nat(150), (noise, at) => {
        const spoilt = withSegments(cameraExif(3));
        spoilt.set(noise.subarray(0, spoilt.length - at), at);
        const { value, problems } = cleanJpeg(spoilt);
        expect(value === null).toBe(problems.length > 0);
        expect(cleanJpeg(noise).value).toBe(null);
      }),
    );
  });

  it('is clean already when it is cleaned again', () => {
    const once = cleanJpeg(withSegments(cameraExif(8), segment(0xfe, 'x'))).value?.bytes;
    expect(cleanJpeg(once ?? new Uint8Array()).value?.bytes).toEqual(once);
  });
});

describe('what a file is', () => {
  it.each([
    ['jpeg', plainJpeg()],
    ['png', Buffer.from('\x89PNG\r\n\x1a\n0000', 'latin1')],
    ['gif', Buffer.from('GIF89a')],
    ['webp', Buffer.from('RIFF0000WEBPVP8 ')],
    ['heic', Buffer.from('\0\0\0\x18ftypheic0000', 'latin1')],
    ['svg', Buffer.from('<?xml version="1.0"?>\n<!-- x -->\n<svg onload="alert(1)">')],
    ['pdf', Buffer.from('%PDF-1.7')],
    ['zip', Buffer.from('PK\x03\x04', 'latin1')],
    ['unknown', Buffer.from('hello')],
    ['unknown', new Uint8Array()],
  ])('is told by its bytes: %s', (kind, bytes) => {
    expect(pictureKind(bytes)).toBe(kind);
  });
});
