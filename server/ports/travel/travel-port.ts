/**
 * Drive times: what the business asks of a road service. Rooms do not call this port themselves: they ask
 * `travelMatrix` and `travelRoute` (server/shops), which keep answers and fall back to an estimate.
 */
import type { LatLon } from '@/lib/travel/place';

export type TravelRefusal = {
  reason: 'unreachable' | 'no-answer' | 'busy' | 'refused';
  /** In words for the log. */
  message: string;
};
export type TravelAnswer<T> = { ok: true; value: T } | { ok: false; refusal: TravelRefusal };

export type TravelPort = {
  /** Minutes from each of `from` (rows) to each of `to` (columns); null where no road leads there. */
  table(ask: { from: LatLon[]; to: LatLon[] }): Promise<TravelAnswer<(number | null)[][]>>;
  /** The line driven through the points in their order, with the minutes of each leg. */
  route(points: LatLon[]): Promise<TravelAnswer<{ line: LatLon[]; legMinutes: number[] }>>;
};
