const signs: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
};

/** Characters that no XML 1.0 document may hold, not even escaped. */
const notAllowed = /[^\t\n\r\u0020-\uD7FF\uE000-\uFFFD\u{10000}-\u{10FFFF}]/gu;

/**
 * Text made safe for the contents and attributes of an XML document.
 *
 * Edge: control characters and halves of surrogate pairs are dropped.
 * Example: `<b> & 1/2"` gives `&lt;b&gt; &amp; 1/2&quot;`.
 * Source: XML 1.0 (fifth edition), 2.2 and 2.4.
 */
export function xmlText(text: string): string {
  return text.replace(notAllowed, '').replace(/[&<>"]/g, (sign) => signs[sign] ?? sign);
}
