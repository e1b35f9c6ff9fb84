import type { TravelRouteInput, TravelRouteView } from '@/lib/contracts/travel';
import { estimateDriveMinutes } from '@/lib/travel/estimate-drive';
import { mustBeAllowed, type PersonContext } from '@/server/base/context';
import { getPorts } from '@/server/ports/choose-ports';

/** The line of a day's drive for the map; straight lines and estimated minutes when no road service answers. */
export async function travelRoute(
  ctx: PersonContext,
  { points }: TravelRouteInput,
): Promise<TravelRouteView> {
  mustBeAllowed(ctx, 'visits:read');
  const answer = await (await getPorts()).travel.route(points);
  if (answer.ok) return { ...answer.value, isEstimated: false };
  ctx.log('drive line estimated', answer.refusal);
  const kmPerHour = ctx.shop.rules.booking.driveKmPerHour;
  const legMinutes = points
    .slice(1)
    .map((point, index) => estimateDriveMinutes(points[index] ?? point, point, kmPerHour));
  return { line: points, legMinutes, isEstimated: true };
}
