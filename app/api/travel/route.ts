import { travelRouteInput } from '@/lib/contracts/travel';
import { handle } from '@/server/base/handle';
import { travelRoute } from '@/server/shops/travel-route';

export const POST = handle(travelRouteInput, travelRoute);
