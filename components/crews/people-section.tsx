'use client';

import type { CrewsView } from '@/lib/contracts/crews';
import type { FeedView } from '@/lib/contracts/feeds';
import { parseRole, roleWords } from '@/lib/permissions';
import { DaysOff } from './days-off';
import { FeedButtons } from './feed-buttons';

type PeopleSectionProps = {
  view: CrewsView;
  feeds: readonly FeedView[];
  mayChange: boolean;
  /** Oneself may always have one's own calendar address. */
  ownPersonId: string;
};

/** Everybody of the shop, when they are off, and their calendar. */
export function PeopleSection({ view, feeds, mayChange, ownPersonId }: PeopleSectionProps) {
  return (
    <ul>
      {view.people.map((person) => {
        const role = parseRole(person.role);
        return (
          <li key={person.id} className="flex flex-col border-b border-rule pt-2 pb-1">
            <p className="flex flex-wrap items-baseline gap-x-3">
              <b>{person.name}</b>
              <span className="text-graphite">{role ? roleWords[role].toLowerCase() : ''}</span>
              <span className="ml-auto text-note">{person.email ?? 'no sign-in'}</span>
            </p>
            <div className="-ml-3.5 flex flex-wrap items-start">
              <DaysOff person={person} today={view.today} mayChange={mayChange} />
              {mayChange || person.id === ownPersonId ? (
                <FeedButtons
                  name={person.name}
                  of={{ personId: person.id }}
                  feeds={feeds.filter(({ personId }) => personId === person.id)}
                />
              ) : null}
            </div>
          </li>
        );
      })}
    </ul>
  );
}
