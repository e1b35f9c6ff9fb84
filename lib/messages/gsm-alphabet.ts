/** The default alphabet of SMS and its extension table (3GPP TS 23.038, 6.2.1; once GSM 03.38). */

/** Characters of one septet, in the order of their codes; code 27 is the escape and no character. */
export const gsmBasic =
  '@£$¥èéùìòÇ\nØø\rÅåΔ_ΦΓΛΩΠΨΣΘΞÆæßÉ !"#¤%&\'()*+,-./0123456789:;<=>?' +
  '¡ABCDEFGHIJKLMNOPQRSTUVWXYZÄÖÑÜ§¿abcdefghijklmnopqrstuvwxyzäöñüà';

/** Characters of two septets: the escape and their own. */
export const gsmExtension = '\f^{}\\[~]|€';

const basic = new Set(gsmBasic);
const extension = new Set(gsmExtension);

/** Septets that a character takes: 1 or 2, or null when the alphabet does not have it. Example: "€" takes 2. */
export function gsmSeptets(character: string): 1 | 2 | null {
  if (basic.has(character)) return 1;
  return extension.has(character) ? 2 : null;
}
