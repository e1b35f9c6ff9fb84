'use client';

import { useCrew } from '@/components/day/crew-language';
import { LinkButton } from '@/components/ui/link-button';
import { TitleBlock } from '@/components/ui/title-block';
import type { TodayVisit } from '@/lib/contracts/visits';
import { paths } from '@/lib/paths';
import { phoneWords } from '@/lib/words/phone-words';
import { AddRoom } from './add-room';
import { usePersonId } from './phone-person';
import { readRoomsOfJob } from './room-store';
import { useLive } from './use-live';

/** The rooms of the job: those that the office knows, and those that this phone has drawn since. */
export function RoomsOfVisit({ visit }: { visit: TodayVisit }) {
  const personId = usePersonId();
  const { words, language } = useCrew();
  const { jobId, jobTitle } = visit;
  const { halfDrawn } = phoneWords[language];
  const live = useLive(`rooms:${jobId}:${language}`, () =>
    readRoomsOfJob(jobId, personId, halfDrawn),
  );
  const known = new Set(visit.rooms.map(({ id }) => id));
  const here = live.state === 'here' ? live.value.filter(({ id }) => !known.has(id)) : [];
  return (
    <section className="flex flex-col gap-2">
      <TitleBlock title={words.rooms} meta={jobTitle} />
      {visit.rooms.map(({ id, name }) => (
        <LinkButton key={id} size="thumb" look="line" href={paths.walls(id)}>
          {words.measureRoom(name)}
        </LinkButton>
      ))}
      {here.map(({ id, name }) => (
        <LinkButton key={id} size="thumb" look="line" href={paths.newWalls(id, jobId)}>
          {words.measureRoom(name)}
        </LinkButton>
      ))}
      <AddRoom jobId={jobId} isFirst={visit.rooms.length + here.length === 0} />
    </section>
  );
}
