'use client';

import { divIcon } from 'leaflet';
import { Marker, Polygon, Polyline } from 'react-leaflet';
import { coast, junctions, type Place, roads, streets, towns } from '@/lib/island/demo-island';

/** The demo's island as the project draws it: land, roads by their speed, streets beside their towns. */
export function IslandGround() {
  return (
    <>
      <Polygon
        positions={coast.map(at)}
        pathOptions={{ className: 'island-land' }}
        interactive={false}
      />
      {roads.map((road) => (
        <Polyline
          key={`${road.from}-${road.to}`}
          positions={[at(nodes[road.from]), at(nodes[road.to])]}
          pathOptions={{
            className: road.kmPerHour >= 60 ? 'island-road island-main' : 'island-road',
          }}
          interactive={false}
        />
      ))}
      {streets.map(({ name, town, north, east }) => (
        <Polyline
          key={name}
          positions={[at(towns[town]), at(beside(towns[town], north, east))]}
          pathOptions={{ className: 'island-street' }}
          interactive={false}
        />
      ))}
      {Object.entries(towns).map(([name, place]) => (
        <Marker
          key={name}
          position={at(place)}
          keyboard={false}
          interactive={false}
          icon={divIcon({ className: 'island-town', html: name, iconSize: [0, 0] })}
        />
      ))}
    </>
  );
}

const nodes: Record<string, Place> & typeof towns & typeof junctions = { ...towns, ...junctions };
const at = ({ latitude, longitude }: Place): [number, number] => [latitude, longitude];

/** An offset in thousandths of a degree. */
const beside = ({ latitude, longitude }: Place, north: number, east: number): Place => ({
  latitude: latitude + north / 1000,
  longitude: longitude + east / 1000,
});
