/** One picture of somebody else's map, asked for by this server: no browser of the shop meets that host. */

export type Tile = { bytes: Uint8Array<ArrayBuffer>; mediaType: string };

const timeoutMs = 5_000;
const mostBytes = 1_000_000;
const pictures = ['image/png', 'image/jpeg', 'image/webp'];

/** Null where nobody answered in time, or with anything but a picture. */
export async function fetchTile(
  template: string,
  { z, x, y }: { z: number; x: number; y: number },
): Promise<Tile | null> {
  const url = template
    .replace('{z}', String(z))
    .replace('{x}', String(x))
    .replace('{y}', String(y));
  try {
    const response = await fetch(url, {
      headers: { accept: pictures.join(', '), 'user-agent': 'Setwell (map of the day)' },
      // Where a service is configured it answers itself; it cannot send this server elsewhere.
      redirect: 'error',
      signal: AbortSignal.timeout(timeoutMs),
    });
    const mediaType = response.headers.get('content-type')?.split(';')[0]?.trim() ?? '';
    if (!response.ok || !pictures.includes(mediaType)) return null;
    const bytes = new Uint8Array(await response.arrayBuffer());
    return bytes.byteLength > mostBytes ? null : { bytes, mediaType };
  } catch {
    return null;
  }
}
