import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { addressPlace, streets } from '@/lib/island/demo-island';
import { islandRoads } from '@/lib/island/demo-roads';
import { driveFinder, type RoadNetwork } from '@/lib/travel/road-network';

/** Along the equator a thousandth of a degree is 111.2 m on the plane. */
const at = (east: number, north = 0) => ({ lat: north / 111.2, lon: east / 111.2 });

const cross: RoadNetwork = {
  nodes: { west: at(0), middle: at(10), east: at(20), north: at(10, 10) },
  roads: [
    { from: 'west', to: 'middle', kmPerHour: 60 },
    { from: 'middle', to: 'east', kmPerHour: 30 },
    { from: 'middle', to: 'north', kmPerHour: 60 },
    { from: 'north', to: 'east', kmPerHour: 120 },
  ],
};

describe('a drive over a network of roads', () => {
  const roads = driveFinder(cross);

  it('along one road takes its length at its speed', () => {
    const { minutes, km } = roads.drive(at(2), at(8));
    expect([minutes, km].map((value) => Math.round(value * 1e6) / 1e6)).toEqual([6, 6]);
  });

  it('goes round where that is quicker than straight on', () => {
    const { minutes, line } = roads.drive(at(10), at(20));
    // Straight: 10 km at 30 is 20 minutes. Round: 10 km at 60 and 14.1 km at 120 is 17.1.
    expect(minutes).toBeCloseTo(10 + (Math.hypot(10, 10) / 120) * 60, 3);
    expect(line).toContainEqual(at(10, 10));
  });

  it('from off the road begins with the lane to it', () => {
    expect(roads.kmToRoad(at(5, -1))).toBeCloseTo(1, 6);
    expect(roads.drive(at(5, -1), at(8)).minutes).toBeCloseTo(3 + 3, 3);
  });

  it('to where one is takes none', () => {
    expect(roads.drive(at(5, -1), at(5, -1))).toMatchObject({ minutes: 0, km: 0 });
  });
});

describe('drives on the island', () => {
  const island = driveFinder(islandRoads);
  const address = fc
    .record({ street: fc.constantFrom(...streets), house: fc.integer({ min: 1, max: 90 }) })
    .map(({ street, house }) => addressPlace(street.name, house))
    .map(({ latitude, longitude }) => ({ lat: latitude, lon: longitude }));

  it('take as long there as back, and no detour by a third place is quicker', () => {
    fc.assert(
      fc.property(address, address, address, (a, b, c) => {
        const there = island.drive(a, b).minutes;
        expect(island.drive(b, a).minutes).toBeCloseTo(there, 6);
        expect(island.drive(a, c).minutes + island.drive(c, b).minutes).toBeGreaterThan(
          there - 1e-6,
        );
      }),
      { numRuns: 200 },
    );
  });

  it('are found as a walk over every road finds them', () => {
    fc.assert(
      fc.property(
        fc.constantFrom(...Object.keys(islandRoads.nodes)),
        fc.constantFrom(...Object.keys(islandRoads.nodes)),
        (from, to) => {
          const [start, end] = [islandRoads.nodes[from], islandRoads.nodes[to]];
          if (!start || !end) throw new Error('a node without a place');
          expect(island.drive(start, end).minutes).toBeCloseTo(slowWay(from, to), 3);
        },
      ),
      { numRuns: 60 },
    );
  });

  /** Relaxes every road until nothing gets better. */
  function slowWay(from: string, to: string): number {
    const best = new Map<string, number>([[from, 0]]);
    for (let round = 0; round < Object.keys(islandRoads.nodes).length; round += 1) {
      for (const road of islandRoads.roads) {
        const [a, b] = [islandRoads.nodes[road.from], islandRoads.nodes[road.to]];
        if (!a || !b) throw new Error('a node without a place');
        const minutes = (60 * straightKm(a, b)) / road.kmPerHour;
        for (const [near, far] of [
          [road.from, road.to],
          [road.to, road.from],
        ] as const) {
          const known = best.get(near);
          if (known === undefined) continue;
          best.set(far, Math.min(best.get(far) ?? Number.POSITIVE_INFINITY, known + minutes));
        }
      }
    }
    return best.get(to) ?? Number.POSITIVE_INFINITY;
  }

  function straightKm(a: { lat: number; lon: number }, b: { lat: number; lon: number }): number {
    const scale = Math.cos(((islandRoads.nodes['Juniper Bend']?.lat ?? 0) * Math.PI) / 180);
    return Math.hypot((a.lat - b.lat) * 111.2, (a.lon - b.lon) * 111.2 * scale);
  }
});
