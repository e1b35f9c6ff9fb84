'use client';

import { divIcon, type LatLngBoundsExpression, latLngBounds } from 'leaflet';
import { useEffect, useMemo } from 'react';
import { MapContainer, Marker, Polyline, ScaleControl, TileLayer, useMap } from 'react-leaflet';
import 'leaflet/dist/leaflet.css';
import { coast } from '@/lib/island/demo-island';
import './day-map.css';
import { IslandGround } from './island-ground';
import type { MapCrew, MapGround, MapPlace } from './map-day';

type LeafletDayMapProps = {
  crews: readonly MapCrew[];
  ground: MapGround;
  lookedAt: string | null;
  onLook: (visitId: string) => void;
};

/** The day on the map: numbered stops and the drive between them, in the crews' colours. */
export function LeafletDayMap({ crews, ground, lookedAt, onLook }: LeafletDayMapProps) {
  const bounds = useMemo(() => boundsOf(crews), [crews]);
  return (
    <MapContainer
      bounds={bounds}
      className="day-map"
      zoomSnap={0.25}
      scrollWheelZoom
      attributionControl={ground !== null}
    >
      {ground ? (
        <TileLayer url={ground.tilesUrl} attribution={ground.attribution} />
      ) : (
        <IslandGround />
      )}
      <ScaleControl />
      <FitTo bounds={bounds} />
      {crews.map((crew) => (
        <CrewWay key={crew.crewId} {...{ crew, lookedAt, onLook }} />
      ))}
    </MapContainer>
  );
}

function CrewWay({
  crew,
  lookedAt,
  onLook,
}: {
  crew: MapCrew;
  lookedAt: string | null;
  onLook: (visitId: string) => void;
}) {
  const style = `--crew: ${crew.colour}`;
  return (
    <>
      {crew.line.length > 1 ? (
        <Polyline
          positions={crew.line.map(at)}
          // The colour is a name of the look, which a presentation attribute would not know.
          pathOptions={{ className: 'day-map-way' }}
          eventHandlers={{
            add: ({ target }) => target.getElement()?.style.setProperty('stroke', crew.colour),
          }}
          interactive={false}
        />
      ) : null}
      {crew.base ? (
        <Marker
          position={at(crew.base)}
          keyboard={false}
          interactive={false}
          icon={divIcon({
            className: '',
            iconSize: [14, 14],
            html: `<span class="day-map-base" style="${style}"></span>`,
          })}
        />
      ) : null}
      {crew.stops.map((stop) => (
        <Marker
          key={stop.visitId}
          position={at(stop.place)}
          title={stop.label}
          alt={`${crew.name}: ${stop.label}`}
          eventHandlers={{ click: () => onLook(stop.visitId) }}
          zIndexOffset={stop.visitId === lookedAt ? 1000 : 0}
          icon={divIcon({
            className: '',
            iconSize: [26, 26],
            html: `<span class="day-map-stop" style="${style}"${stop.visitId === lookedAt ? ' data-looked' : ''}>${stop.number}</span>`,
          })}
        />
      ))}
    </>
  );
}

function FitTo({ bounds }: { bounds: LatLngBoundsExpression }) {
  const map = useMap();
  useEffect(() => {
    map.fitBounds(bounds, { padding: [28, 28], maxZoom: 14, animate: false });
  }, [map, bounds]);
  return null;
}

const at = ({ lat, lon }: MapPlace): [number, number] => [lat, lon];

/** Around all that is on the map; around the island where nothing is. */
function boundsOf(crews: readonly MapCrew[]) {
  const places = crews.flatMap(({ base, stops }) => [
    ...(base ? [base] : []),
    ...stops.map(({ place }) => place),
  ]);
  const shown = places.length > 0 ? places.map(at) : null;
  return latLngBounds(shown ?? coast.map(({ latitude, longitude }) => [latitude, longitude]));
}
