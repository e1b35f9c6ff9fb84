/**
 * Opens the phone's own map at an address: `geo:` where the system knows it (Android), Apple's scheme on
 * its phones. The address goes to the map that the person chose, and to nobody else.
 */
export function directionsHref(street: string, town: string, userAgent: string): string {
  const where = encodeURIComponent([street, town].filter(Boolean).join(', '));
  return /iPhone|iPad|Macintosh/.test(userAgent) ? `maps:?daddr=${where}` : `geo:0,0?q=${where}`;
}
