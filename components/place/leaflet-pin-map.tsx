'use client';

import { divIcon, latLngBounds } from 'leaflet';
import { MapContainer, Marker, TileLayer, useMapEvents } from 'react-leaflet';
import 'leaflet/dist/leaflet.css';
import '@/components/map/day-map.css';
import { IslandGround } from '@/components/map/island-ground';
import type { MapGround } from '@/components/map/map-day';
import { coast } from '@/lib/island/demo-island';
import type { LatLon } from '@/lib/travel/place';

type LeafletPinMapProps = {
  place: LatLon | null;
  ground: MapGround;
  onPut: (place: LatLon) => void;
};

const closeUp = 14;
const wholeIsland = latLngBounds(coast.map(({ latitude, longitude }) => [latitude, longitude]));

/** A click puts the pin; it can be dragged, and moved by the arrow keys. */
export function LeafletPinMap({ place, ground, onPut }: LeafletPinMapProps) {
  const view = place
    ? { center: [place.lat, place.lon] as [number, number], zoom: closeUp }
    : { bounds: wholeIsland };
  return (
    <div className="h-80">
      <MapContainer {...view} className="day-map" attributionControl={ground !== null}>
        {ground ? (
          <TileLayer url={ground.tilesUrl} attribution={ground.attribution} />
        ) : (
          <IslandGround />
        )}
        <Clicks onPut={onPut} />
        {place ? (
          <Marker
            position={[place.lat, place.lon]}
            draggable
            title="The pin"
            alt="The pin"
            eventHandlers={{
              dragend: ({ target }) => {
                const { lat, lng } = target.getLatLng();
                onPut({ lat, lon: lng });
              },
            }}
            icon={divIcon({
              className: '',
              iconSize: [14, 14],
              html: '<span class="day-map-base" style="--crew: var(--chalk)"></span>',
            })}
          />
        ) : null}
      </MapContainer>
    </div>
  );
}

function Clicks({ onPut }: { onPut: (place: LatLon) => void }) {
  useMapEvents({ click: ({ latlng }) => onPut({ lat: latlng.lat, lon: latlng.lng }) });
  return null;
}
