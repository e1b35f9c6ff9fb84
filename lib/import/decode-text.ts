/** The bytes of a list as text, whatever the program that wrote it. */

export type TextEncodingName = 'UTF-8' | 'UTF-16' | 'Windows-1252';
export type DecodedText = { text: string; encoding: TextEncodingName };

/**
 * UTF-16 by its mark, UTF-8 where every byte agrees with it, else Windows-1252, which spreadsheets in the West
 * save. Line ends and the mark are taken off the start; nothing is lost. NUL and other control characters are
 * left for the reader of the rows.
 * Example: the bytes 4D FC 6C 6C 65 72 are "Müller" in Windows-1252. Source: WHATWG Encoding, 4.1 and 9.
 */
export function decodeText(bytes: Uint8Array): DecodedText {
  const [first, second] = bytes;
  if (first === 0xff && second === 0xfe) return decoded(bytes, 'utf-16le', 'UTF-16');
  if (first === 0xfe && second === 0xff) return decoded(bytes, 'utf-16be', 'UTF-16');
  try {
    return { text: new TextDecoder('utf-8', { fatal: true }).decode(bytes), encoding: 'UTF-8' };
  } catch {
    return { text: fromWindows1252(bytes), encoding: 'Windows-1252' };
  }
}

function decoded(bytes: Uint8Array, label: string, encoding: TextEncodingName): DecodedText {
  return { text: new TextDecoder(label).decode(bytes), encoding };
}

/** 0x80 to 0x9F; the rest is Latin-1. Node 20's own decoder takes these for control characters. */
const windows1252Marks = '€\u0081‚ƒ„…†‡ˆ‰Š‹Œ\u008dŽ\u008f\u0090‘’“”•–—˜™š›œ\u009džŸ';

function fromWindows1252(bytes: Uint8Array): string {
  let text = '';
  for (const byte of bytes) {
    text +=
      byte >= 0x80 && byte <= 0x9f ? windows1252Marks[byte - 0x80] : String.fromCharCode(byte);
  }
  return text;
}
