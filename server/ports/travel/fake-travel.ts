/** A road service on loopback over the demo island's roads; it speaks OSRM's HTTP protocol, table and route. */
import { islandRoads } from '@/lib/island/demo-roads';
import { isPlace, type LatLon } from '@/lib/travel/place';
import { driveFinder } from '@/lib/travel/road-network';
import { type JsonAnswer, startFakeJsonServer } from '@/server/ports/fakes/fake-json-server';

export type FakeTravel = Awaited<ReturnType<typeof startFakeTravel>>;

/** Farther from any road than this is off the island. */
const MOST_KM_TO_ROAD = 5;
const MOST_COORDINATES = 100;
const SECONDS = 60;

const island = driveFinder(islandRoads);

export const startFakeTravel = (port = 0) => startFakeJsonServer(answer, port);

function answer(url: URL): JsonAnswer {
  const [, service, version, profile, coordinates] =
    /^\/(table|route)\/(v\d)\/(\w+)\/([^/]+)$/.exec(decodeURIComponent(url.pathname)) ?? [];
  if (!service || version !== 'v1' || profile !== 'driving') {
    return refuse('InvalidUrl', 'URL string malformed');
  }
  const points = readPoints(coordinates ?? '');
  if (!points) return refuse('InvalidQuery', 'Query string malformed');
  if (points.length > MOST_COORDINATES) return refuse('TooBig', 'Too many coordinates');
  const lost = points.findIndex((point) => island.kmToRoad(point) > MOST_KM_TO_ROAD);
  if (lost >= 0) {
    return refuse('NoSegment', `Could not find a matching segment for coordinate ${lost}`);
  }
  return service === 'table' ? table(points, url.searchParams) : route(points);
}

function table(points: LatLon[], query: URLSearchParams): JsonAnswer {
  const from = readIndices(query.get('sources'), points);
  const to = readIndices(query.get('destinations'), points);
  if (!from || !to) return refuse('InvalidOptions', 'Sources or destinations are malformed');
  const durations = from.map((source) =>
    to.map((target) => tenths(island.drive(source, target).minutes * SECONDS)),
  );
  return ok({ sources: from.map(waypoint), destinations: to.map(waypoint), durations });
}

function route(points: LatLon[]): JsonAnswer {
  if (points.length < 2)
    return refuse('InvalidOptions', 'Number of coordinates needs to be at least two');
  const drives = points.slice(1).map((point, index) => island.drive(points[index] ?? point, point));
  const line = drives.flatMap(({ line }, index) => (index === 0 ? line : line.slice(1)));
  const sum = (of: (drive: (typeof drives)[number]) => number) =>
    tenths(drives.reduce((total, drive) => total + of(drive), 0));
  return ok({
    waypoints: points.map(waypoint),
    routes: [
      {
        distance: sum(({ km }) => km * 1000),
        duration: sum(({ minutes }) => minutes * SECONDS),
        geometry: { type: 'LineString', coordinates: line.map(({ lat, lon }) => [lon, lat]) },
        legs: drives.map(({ km, minutes }) => ({
          distance: tenths(km * 1000),
          duration: tenths(minutes * SECONDS),
          steps: [],
        })),
      },
    ],
  });
}

function readPoints(text: string): LatLon[] | null {
  const points = text.split(';').map((pair) => {
    const [lon, lat, ...more] = pair.split(',');
    const isPair = lon?.trim() && lat?.trim() && more.length === 0;
    return isPair ? { lat: Number(lat), lon: Number(lon) } : { lat: Number.NaN, lon: Number.NaN };
  });
  return points.every(isPlace) ? points : null;
}

function readIndices(text: string | null, points: LatLon[]): LatLon[] | null {
  if (text === null || text === 'all') return points;
  const chosen = text.split(';').map((index) => points[Number(index)]);
  return chosen.every((point) => point !== undefined) ? (chosen as LatLon[]) : null;
}

const waypoint = ({ lat, lon }: LatLon) => ({ name: '', location: [lon, lat] });
const tenths = (value: number) => Math.round(value * 10) / 10;
const ok = (body: object): JsonAnswer => ({ status: 200, body: { code: 'Ok', ...body } });
const refuse = (code: string, message: string): JsonAnswer => ({
  status: 400,
  body: { code, message },
});
