/** Drive times, lines on the map and addresses looked up, on the wire. */
import { z } from 'zod';

export const latLon = z.object({
  lat: z.number().min(-90).max(90),
  lon: z.number().min(-180).max(180),
});

/** Where a job's site is; null takes the pin away. */
export const placeSiteInput = z.object({ jobId: z.uuid(), place: latLon.nullable() });
export type PlaceSiteInput = z.infer<typeof placeSiteInput>;

/** More stops than any crew makes in a day. */
const mostPoints = 30;

export const travelRouteInput = z.object({ points: z.array(latLon).min(2).max(mostPoints) });
export type TravelRouteInput = z.infer<typeof travelRouteInput>;

export const travelRouteView = z.object({
  /** Along the roads; straight from point to point when estimated. */
  line: z.array(latLon),
  legMinutes: z.array(z.number()),
  /** The road service did not answer: geodesic × 1.3 at the shop's speed. Screens say so. */
  isEstimated: z.boolean(),
});
export type TravelRouteView = z.infer<typeof travelRouteView>;

export const findAddressInput = z.object({
  street: z.string().trim().min(3, 'Give the street and number.').max(160),
  town: z.string().trim().max(80).default(''),
  postcode: z.string().trim().max(20).default(''),
});
export type FindAddressInput = z.infer<typeof findAddressInput>;

export const foundPlace = latLon.extend({
  /** As the service writes it: "14 Quay Rise, Quayside". */
  label: z.string(),
  /** house: the door; street: somewhere along it; area: no nearer than the town. */
  nearness: z.enum(['house', 'street', 'area']),
});
export type FoundPlace = z.infer<typeof foundPlace>;

export const foundAddress = z.object({
  places: z.array(foundPlace),
  /** False: nobody answered, so that the pin is put by hand. */
  isAnswered: z.boolean(),
});
export type FoundAddress = z.infer<typeof foundAddress>;
