'use client';

import { useState } from 'react';
import type { MapGround } from '@/components/map/map-day';
import { usePageKeys } from '@/components/shell/page-keys';
import { EmptyState } from '@/components/ui/empty-state';
import type { CrewsView } from '@/lib/contracts/crews';
import type { FeedView } from '@/lib/contracts/feeds';
import { CrewEdit } from './crew-edit';
import { CrewLine } from './crew-line';
import { useRefetchCrews } from './crews-query';
import { FeedButtons } from './feed-buttons';

type CrewSectionProps = {
  view: CrewsView;
  feeds: readonly FeedView[];
  ground: MapGround;
  mayChange: boolean;
};

/** The crews, each changed where it stands; the figures open the first nine. */
export function CrewSection({ view, feeds, ground, mayChange }: CrewSectionProps) {
  const [openId, setOpenId] = useState<string | null>(null);
  const refetch = useRefetchCrews();
  const toggle = (id: string) => setOpenId(openId === id ? null : id);
  usePageKeys(
    'Crews',
    mayChange
      ? view.crews.slice(0, 9).map(({ id, name }, index) => ({
          keys: String(index + 1),
          words: `Change ${name}`,
          run: () => toggle(id),
        }))
      : [],
  );
  if (view.crews.length === 0) {
    return (
      <EmptyState title="No crew yet">
        A visit is booked with a crew: add one that measures and one that installs.
      </EmptyState>
    );
  }
  return (
    <ul>
      {view.crews.map((crew) => (
        <li key={crew.id}>
          <CrewLine
            crew={crew}
            isOpen={openId === crew.id}
            onEdit={mayChange ? () => toggle(crew.id) : undefined}
          >
            {mayChange ? (
              <FeedButtons
                name={crew.name}
                of={{ crewId: crew.id }}
                feeds={feeds.filter(({ crewId }) => crewId === crew.id)}
              />
            ) : null}
          </CrewLine>
          {openId === crew.id ? (
            <CrewEdit
              crew={crew}
              people={view.people}
              ground={ground}
              today={view.today}
              onDone={() => {
                setOpenId(null);
                void refetch();
              }}
            />
          ) : null}
        </li>
      ))}
    </ul>
  );
}
