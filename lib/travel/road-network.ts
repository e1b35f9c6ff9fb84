/**
 * Shortest drives over a small network of straight roads. A place is met by the nearest point of the
 * nearest road; the way from the road to the place is driven at walking-the-lane speed.
 */
import type { LatLon } from './place';

export type Road = { from: string; to: string; kmPerHour: number };
export type RoadNetwork = { nodes: Record<string, LatLon>; roads: readonly Road[] };

export type Drive = { minutes: number; km: number; line: LatLon[] };

type OnRoad = { road: Road; at: LatLon; kmFromStart: number; roadKm: number; offRoadKm: number };
type Way = { minutes: number; km: number; via: string[] };

const LANE_KM_PER_HOUR = 20;
const KM_PER_DEGREE = 111.2;

export type DriveFinder = {
  /** How far the nearest road is, in kilometres. */
  kmToRoad(place: LatLon): number;
  drive(from: LatLon, to: LatLon): Drive;
};

/**
 * Answers drives over a network; the ways between its nodes are worked out once (Floyd–Warshall).
 * Frame: distances on a plane that touches the globe at the network, good to 1 % over a county.
 * Example: two places on one road of 60 km/h, 10 km apart, are 10 minutes apart.
 */
export function driveFinder(network: RoadNetwork): DriveFinder {
  const names = Object.keys(network.nodes);
  const kmBetween = planeAt(network.nodes[names[0] ?? ''] ?? { lat: 0, lon: 0 });
  const placeOf = (name: string) => network.nodes[name] ?? { lat: Number.NaN, lon: Number.NaN };
  const ways = allWays(network, (road) => kmBetween(placeOf(road.from), placeOf(road.to)));

  function nearest(place: LatLon): OnRoad {
    const found = network.roads
      .map((road) => meetRoad(road, { start: placeOf(road.from), end: placeOf(road.to), place }))
      .reduce((best, next) => (next.offRoadKm < best.offRoadKm ? next : best));
    return found;
  }

  function meetRoad(road: Road, line: { start: LatLon; end: LatLon; place: LatLon }): OnRoad {
    const { start, end, place } = line;
    const roadKm = kmBetween(start, end);
    const east = (point: LatLon) => kmBetween.east(start, point);
    const north = (point: LatLon) => kmBetween.north(start, point);
    const along =
      roadKm === 0 ? 0 : (east(place) * east(end) + north(place) * north(end)) / (roadKm * roadKm);
    const share = Math.min(1, Math.max(0, along));
    const at = {
      lat: start.lat + (end.lat - start.lat) * share,
      lon: start.lon + (end.lon - start.lon) * share,
    };
    return {
      road,
      at,
      kmFromStart: roadKm * share,
      roadKm,
      offRoadKm: kmBetween(place, at),
    };
  }

  return {
    kmToRoad: (place) => nearest(place).offRoadKm,
    drive(from, to) {
      const start = nearest(from);
      const end = nearest(to);
      const way = bestWay(start, end, ways);
      const laneKm = start.offRoadKm + end.offRoadKm;
      const isSamePlace = from.lat === to.lat && from.lon === to.lon;
      if (isSamePlace) return { minutes: 0, km: 0, line: [from, to] };
      return {
        minutes: way.minutes + (laneKm / LANE_KM_PER_HOUR) * 60,
        km: way.km + laneKm,
        line: [from, start.at, ...way.via.map(placeOf), end.at, to],
      };
    },
  };
}

/** Along the road that both are on, or by the better end of each. */
function bestWay(start: OnRoad, end: OnRoad, ways: Map<string, Way>): Way {
  const candidates: Way[] = [];
  if (start.road === end.road) {
    const km = Math.abs(start.kmFromStart - end.kmFromStart);
    candidates.push({ km, minutes: minutesOf(km, start.road), via: [] });
  }
  for (const out of endsOf(start)) {
    for (const back of endsOf(end)) {
      const between = ways.get(wayKey(out.node, back.node));
      if (!between) continue;
      candidates.push({
        km: out.km + between.km + back.km,
        minutes: minutesOf(out.km, start.road) + between.minutes + minutesOf(back.km, end.road),
        via: between.via,
      });
    }
  }
  return candidates.reduce((best, next) => (next.minutes < best.minutes ? next : best), {
    minutes: Number.POSITIVE_INFINITY,
    km: Number.POSITIVE_INFINITY,
    via: [],
  });
}

function endsOf({ road, kmFromStart, roadKm }: OnRoad) {
  return [
    { node: road.from, km: kmFromStart },
    { node: road.to, km: roadKm - kmFromStart },
  ];
}

function allWays(network: RoadNetwork, lengthOf: (road: Road) => number): Map<string, Way> {
  const names = Object.keys(network.nodes);
  const ways = new Map<string, Way>();
  const put = (from: string, to: string, way: Way) => {
    const known = ways.get(wayKey(from, to));
    if (!known || way.minutes < known.minutes) ways.set(wayKey(from, to), way);
  };
  for (const name of names) put(name, name, { minutes: 0, km: 0, via: [name] });
  for (const road of network.roads) {
    const km = lengthOf(road);
    const minutes = minutesOf(km, road);
    put(road.from, road.to, { km, minutes, via: [road.from, road.to] });
    put(road.to, road.from, { km, minutes, via: [road.to, road.from] });
  }
  for (const middle of names) {
    for (const from of names) {
      const first = ways.get(wayKey(from, middle));
      if (!first) continue;
      for (const to of names) {
        const second = ways.get(wayKey(middle, to));
        if (!second) continue;
        put(from, to, {
          km: first.km + second.km,
          minutes: first.minutes + second.minutes,
          via: [...first.via, ...second.via.slice(1)],
        });
      }
    }
  }
  return ways;
}

const wayKey = (from: string, to: string) => `${from}→${to}`;
const minutesOf = (km: number, road: Road) => (km / road.kmPerHour) * 60;

/** Kilometres on the plane that touches the globe at a place. */
function planeAt(origin: LatLon) {
  const eastScale = KM_PER_DEGREE * Math.cos((origin.lat * Math.PI) / 180);
  const east = (from: LatLon, to: LatLon) => (to.lon - from.lon) * eastScale;
  const north = (from: LatLon, to: LatLon) => (to.lat - from.lat) * KM_PER_DEGREE;
  const km = (from: LatLon, to: LatLon) => Math.hypot(east(from, to), north(from, to));
  return Object.assign(km, { east, north });
}
