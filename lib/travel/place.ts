/** A point on the ground: degrees, WGS 84; north and east positive. */
export type LatLon = { lat: number; lon: number };

/** Four decimals are eleven metres: the same driveway, and nobody's front door. */
const DECIMALS = 4;

/**
 * The point under which drive times are kept: rounded, so that two looks at one site are one question.
 * Example: 41.28434, -58.31196 is kept as 41.2843, -58.312.
 */
export function roundedPlace({ lat, lon }: LatLon): LatLon {
  return { lat: rounded(lat), lon: rounded(lon) };
}

/** A rounded place as text, "41.2843,-58.312"; equal for equal places. */
export function placeKey(place: LatLon): string {
  const { lat, lon } = roundedPlace(place);
  return `${lat},${lon}`;
}

/** Whether both degrees are on the globe. Example: 91, 0 is not; -90, 180 is. */
export function isPlace({ lat, lon }: LatLon): boolean {
  return Math.abs(lat) <= 90 && Math.abs(lon) <= 180;
}

function rounded(degrees: number): number {
  const scale = 10 ** DECIMALS;
  // Added to zero, so that a minus nought is nought.
  return 0 + Math.round(degrees * scale) / scale;
}
