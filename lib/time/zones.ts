/**
 * The IANA zones. The only file that knows the library with the zone data: Node's own data is a year older
 * and an hour wrong for British Columbia and Alberta since 2026-11-01.
 */
import moment from 'moment-timezone';

/** An IANA zone name, "America/Denver", checked with `isZone` when it is saved. */
export type Zone = string & { readonly __kind?: 'zone' };

/** Whether the name is one of the IANA zones or links. Example: "America/Denver" is, "Denver" is not. */
export function isZone(name: string): name is Zone {
  return moment.tz.zone(name) !== null;
}

/**
 * The zones of a country (ISO 3166-1, two letters), sorted by name; none for an unknown country.
 * Example: "GB" has "Europe/London" alone.
 */
export function zonesOf(country: string): Zone[] {
  return moment.tz.zonesForCountry(country) ?? [];
}

/**
 * Minutes ahead of UTC at an instant, given in milliseconds of the Unix epoch.
 * Example: New York at 2026-07-01T12:00Z is -240. Throws on an unknown zone, which `isZone` keeps out.
 */
export function offsetMinutesAt(instantMs: number, zone: Zone): number {
  const data = moment.tz.zone(zone);
  if (!data) throw new RangeError(`Not a zone: ${JSON.stringify(zone)}`);
  // Taken from zero, so that UTC is 0 and never -0.
  return 0 - data.utcOffset(instantMs);
}
