'use client';

import { useState } from 'react';
import type { MapGround } from '@/components/map/map-day';
import { problemOf } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';
import type { FindAddressInput, FoundPlace } from '@/lib/contracts/travel';
import type { LatLon } from '@/lib/travel/place';
import { degreesText, readDegrees } from './degrees-text';
import { findAddress } from './find-address-query';
import { PinMap } from './pin-map';

type PlaceFieldProps = {
  /** What is looked up: read when the button is pressed. */
  addressOf: () => FindAddressInput;
  place: LatLon | null;
  ground: MapGround;
  onChange: (place: LatLon | null) => void;
};

/** Where an address is: looked up, or the pin put by hand on the map, or the degrees typed. */
export function PlaceField({ addressOf, place, ground, onChange }: PlaceFieldProps) {
  const [found, setFound] = useState<FoundPlace[]>([]);
  const [said, setSaid] = useState('');
  const [isBusy, setIsBusy] = useState(false);
  const [isMapOpen, setIsMapOpen] = useState(false);
  const [typed, setTyped] = useState<string | null>(null);

  async function look() {
    setIsBusy(true);
    try {
      const { places, isAnswered } = await findAddress(addressOf());
      const [best, ...others] = places;
      setFound(others.length > 0 ? places : []);
      if (!isAnswered) setSaid('No address service answered: put the pin by hand.');
      else if (!best) setSaid('Nobody knows this address: put the pin by hand.');
      else setSaid(saidOf(best));
      if (best) onChange({ lat: best.lat, lon: best.lon });
      else setIsMapOpen(true);
    } catch (caught) {
      setSaid(problemOf(caught).title);
    } finally {
      setIsBusy(false);
    }
  }

  return (
    <div className="flex flex-col gap-2">
      <div className="flex flex-wrap items-end gap-2">
        <Button look="line" onClick={look} busyText={isBusy ? 'Looking…' : undefined}>
          Look the address up
        </Button>
        <Button look="plain" aria-expanded={isMapOpen} onClick={() => setIsMapOpen(!isMapOpen)}>
          {isMapOpen ? 'Close the map' : 'Put the pin by hand'}
        </Button>
      </div>
      <p role="status" className="text-note text-graphite">
        {said || (place ? 'The pin stands.' : 'No pin yet: drives are guessed without one.')}
      </p>
      {found.length > 1 ? (
        <ul className="flex flex-wrap gap-2">
          {found.map((one) => (
            <li key={`${one.label} ${one.lat}`}>
              <Button
                look="line"
                onClick={() => {
                  onChange({ lat: one.lat, lon: one.lon });
                  setSaid(saidOf(one));
                }}
              >
                {one.label}
              </Button>
            </li>
          ))}
        </ul>
      ) : null}
      {isMapOpen ? (
        <>
          <PinMap place={place} ground={ground} onPut={onChange} />
          <TextField
            label="Degrees north, degrees east"
            hint="As a map copies them: 41.28400, -58.31200"
            value={typed ?? degreesText(place)}
            error={
              typed !== null && typed !== '' && !readDegrees(typed)
                ? 'Two numbers of degrees, please.'
                : undefined
            }
            onChange={(event) => {
              setTyped(event.target.value);
              const read = readDegrees(event.target.value);
              if (read) onChange(read);
              if (event.target.value.trim() === '') onChange(null);
            }}
            onBlur={() => setTyped(null)}
          />
        </>
      ) : null}
    </div>
  );
}

function saidOf({ label, nearness }: FoundPlace): string {
  if (nearness === 'house') return `Found: ${label}.`;
  return nearness === 'street'
    ? `Found the street, not the house: ${label}. Move the pin if it matters.`
    : `Found no nearer than ${label}. Put the pin by hand.`;
}
