import { Geodesic } from 'geographiclib-geodesic';
import type { LatLon } from './place';

/** How much longer a road is than the line over the ground. Common practice, no source. */
export const roadOverGeodesic = 1.3;
/** Towns, lanes and main roads of a working day together. Common practice, no source. */
export const usualDriveKmPerHour = 45;

/**
 * The shortest line over the ground between two places, in kilometres, on the ellipsoid WGS 84.
 * Example: from 0° to 1° along the equator is 111.319 km. Source: C. F. F. Karney, Algorithms for
 * geodesics, Journal of Geodesy 87 (2013), 43–55; a sphere would be up to 0.35 % off.
 */
export function geodesicKm(from: LatLon, to: LatLon): number {
  const { s12 = Number.NaN } = Geodesic.WGS84.Inverse(from.lat, from.lon, to.lat, to.lon);
  return s12 / 1000;
}

/**
 * Driving minutes when no road service answers: the geodesic, 1.3 times, at the shop's speed. Not rounded.
 * Example: 30 km of geodesic at 45 km/h is 52 minutes. Screens say "estimated" beside it.
 */
export function estimateDriveMinutes(
  from: LatLon,
  to: LatLon,
  kmPerHour: number = usualDriveKmPerHour,
): number {
  return ((geodesicKm(from, to) * roadOverGeodesic) / kmPerHour) * 60;
}
