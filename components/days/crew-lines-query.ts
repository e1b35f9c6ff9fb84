'use client';

import { useQueries } from '@tanstack/react-query';
import type { MapPlace } from '@/components/map/map-day';
import { askServer } from '@/components/shell/ask-server';
import type { CrewDay } from '@/lib/contracts/day-plans';
import type { TravelRouteView } from '@/lib/contracts/travel';
import { apiPaths } from '@/lib/paths';

/** From the base by the stops and home; a place that is not on the map is left out. */
export function placesOf({ base, stops }: CrewDay): MapPlace[] {
  const places = [base, ...stops.map(({ place }) => place), base];
  return places.filter((place) => place !== null);
}

/** The drive of each crew along the roads; straight from stop to stop until it is known. */
export function useCrewLines(crews: readonly CrewDay[]): MapPlace[][] {
  return useQueries({
    queries: crews.map((crew) => {
      const points = placesOf(crew);
      return {
        queryKey: ['travel', points],
        queryFn: ({ signal }: { signal: AbortSignal }) =>
          askServer<TravelRouteView>(apiPaths.travel(), {
            method: 'POST',
            body: { points },
            signal,
          }),
        enabled: points.length > 1,
        staleTime: Number.POSITIVE_INFINITY,
      };
    }),
    combine: (answers) =>
      answers.map(({ data }, index) => {
        const crew = crews[index];
        return data?.line ?? (crew ? placesOf(crew) : []);
      }),
  });
}
