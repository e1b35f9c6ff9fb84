'use client';

import type { MapGround } from '@/components/map/map-day';
import { TitleBlock } from '@/components/ui/title-block';
import type { CrewsView } from '@/lib/contracts/crews';
import type { FeedView } from '@/lib/contracts/feeds';
import { ClosedDays } from './closed-days';
import { CrewForm } from './crew-form';
import { CrewSection } from './crew-section';
import { useCrews, useFeeds } from './crews-query';
import { InviteForm } from './invite-form';
import { OutsideList } from './outside-list';
import { PeopleSection } from './people-section';

type CrewsScreenProps = {
  view: CrewsView;
  feeds: FeedView[];
  ground: MapGround;
  ownPersonId: string;
  mayChange: boolean;
  mayInvite: boolean;
};

/** Who goes out with whom, when, and from where; and what stands outside of that. */
export function CrewsScreen(props: CrewsScreenProps) {
  const view = useCrews(props.view);
  const feeds = useFeeds(props.feeds);
  const { ground, mayChange, mayInvite, ownPersonId } = props;
  return (
    <>
      {view.outside.length > 0 ? (
        <section className="mb-8 border-l-4 border-chalk bg-sheet px-4 py-3">
          <TitleBlock
            title="Visits outside the crew's days"
            meta="they stay until you move them in the diary"
          />
          <OutsideList visits={view.outside} />
        </section>
      ) : null}
      <div className="grid gap-x-10 gap-y-8 xl:grid-cols-2">
        <section>
          <TitleBlock title="Crews" meta={view.crews.length} />
          <CrewSection view={view} feeds={feeds} ground={ground} mayChange={mayChange} />
          {mayChange ? <CrewForm people={view.people} /> : null}
        </section>
        <div className="flex flex-col gap-8">
          <section>
            <TitleBlock title="People" meta={view.people.length} />
            <PeopleSection
              view={view}
              feeds={feeds}
              mayChange={mayChange}
              ownPersonId={ownPersonId}
            />
            {mayInvite ? <InviteForm /> : null}
          </section>
          <section>
            <TitleBlock title="Closed days" className="mb-3" />
            <ClosedDays view={view} mayChange={mayChange} />
          </section>
        </div>
      </div>
    </>
  );
}
