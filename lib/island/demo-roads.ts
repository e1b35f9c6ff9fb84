import type { RoadNetwork } from '@/lib/travel/road-network';
import { junctions, type Place, roads, towns } from './demo-island';

/** The island's roads, for drives over them. */
export const islandRoads: RoadNetwork = {
  nodes: Object.fromEntries(
    Object.entries<Place>({ ...towns, ...junctions }).map(([name, place]) => [
      name,
      { lat: place.latitude, lon: place.longitude },
    ]),
  ),
  roads,
};
