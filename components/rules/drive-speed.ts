import type { Region } from '@/lib/words/trade';

const KM_PER_MILE = 1.609344;

/** Roads are in miles where their signs are. */
const isInMiles = (region: Region) => region === 'US' || region === 'UK';

export const speedUnit = (region: Region) => (isInMiles(region) ? 'mph' : 'km/h');

/** To a whole mile: 45 km/h is shown as 28 mph. */
export function shownSpeed(kmPerHour: number, region: Region): string {
  return String(isInMiles(region) ? Math.round(kmPerHour / KM_PER_MILE) : kmPerHour);
}

/** The speed typed; left as it was shown it keeps its exact value. */
export function typedSpeed(typed: string, before: number, region: Region): number {
  if (typed.trim() === shownSpeed(before, region)) return before;
  return Number(typed) * (isInMiles(region) ? KM_PER_MILE : 1);
}
