'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import type { MapGround } from '@/components/map/map-day';
import { askServer, problemOf } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { showToast } from '@/components/ui/toast-store';
import type { JobView } from '@/lib/contracts/jobs';
import { apiPaths } from '@/lib/paths';
import type { LatLon } from '@/lib/travel/place';
import { PlaceField } from './place-field';

type SitePlaceProps = {
  job: Pick<JobView, 'id' | 'street' | 'town' | 'postcode' | 'latitude' | 'longitude'>;
  ground: MapGround;
};

/** The pin of a job's site: looked up or put by hand, then saved. */
export function SitePlace({ job, ground }: SitePlaceProps) {
  const router = useRouter();
  const { latitude, longitude } = job;
  const kept = latitude === null || longitude === null ? null : { lat: latitude, lon: longitude };
  const [place, setPlace] = useState<LatLon | null>(kept);
  const isChanged = place?.lat !== kept?.lat || place?.lon !== kept?.lon;

  async function save() {
    try {
      await askServer(apiPaths.jobPlace(job.id), { method: 'PATCH', body: { place } });
      showToast({ text: 'The pin is saved.' });
      router.refresh();
    } catch (caught) {
      showToast({ text: problemOf(caught).title, isProblem: true });
    }
  }

  return (
    <div className="mt-2 flex flex-col gap-2">
      <PlaceField
        addressOf={() => ({ street: job.street, town: job.town, postcode: job.postcode })}
        place={place}
        ground={ground}
        onChange={setPlace}
      />
      {isChanged ? (
        <div>
          <Button onClick={save}>Save the pin</Button>
        </div>
      ) : null}
    </div>
  );
}
