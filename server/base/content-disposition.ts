/**
 * Whether a browser shows a file or saves it, and what it is called then: plain letters for every browser,
 * and beside them the name as it is where it has others.
 * Source: RFC 6266, 4 and 5; RFC 8187, 3.2.
 */
export function contentDisposition(how: 'inline' | 'attachment', name: string): string {
  const plain = name
    .normalize('NFKD')
    .replace(/\p{Mark}/gu, '')
    .replace(/[^\w.-]+/g, '-');
  const header = `${how}; filename="${plain}"`;
  return plain === name ? header : `${header}; filename*=UTF-8''${extended(name)}`;
}

/** Percent signs for all but the letters that RFC 8187 lets stand. */
function extended(name: string): string {
  return encodeURIComponent(name.toWellFormed()).replace(
    /['()*]/g,
    (sign) => `%${sign.charCodeAt(0).toString(16).toUpperCase()}`,
  );
}
