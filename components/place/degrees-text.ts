import { isPlace, type LatLon } from '@/lib/travel/place';

/** "41.28400, -58.31200": a metre is the fifth decimal. */
export function degreesText(place: LatLon | null): string {
  return place ? `${place.lat.toFixed(5)}, ${place.lon.toFixed(5)}` : '';
}

/** Latitude, then longitude, as maps give them when a place is copied; null for anything else. */
export function readDegrees(text: string): LatLon | null {
  const [, lat, lon] =
    /^\s*(-?\d{1,2}(?:\.\d+)?)\s*[,; ]\s*(-?\d{1,3}(?:\.\d+)?)\s*$/.exec(text) ?? [];
  if (lat === undefined || lon === undefined) return null;
  const place = { lat: Number(lat), lon: Number(lon) };
  return isPlace(place) ? place : null;
}
