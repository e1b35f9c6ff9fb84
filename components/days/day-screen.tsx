'use client';

import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { crewColour } from '@/components/diary/crew-colour';
import { DayMap } from '@/components/map/day-map';
import type { MapCrew, MapGround } from '@/components/map/map-day';
import { usePageKeys } from '@/components/shell/page-keys';
import { Button } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { ErrorState } from '@/components/ui/error-state';
import { LinkButton } from '@/components/ui/link-button';
import { Skeleton, SkeletonScreen } from '@/components/ui/skeleton';
import { TitleBlock } from '@/components/ui/title-block';
import type { CrewDay } from '@/lib/contracts/day-plans';
import { paths } from '@/lib/paths';
import { addDays } from '@/lib/time/civil';
import { CrewDayList } from './crew-day-list';
import { useCrewLines } from './crew-lines-query';
import { useDayPlan } from './day-plan-query';
import { movesOfPlan } from './plan-moves';
import { PlanOffer } from './plan-offer';

type DayScreenProps = {
  date: string;
  today: string;
  title: string;
  ground: MapGround;
  mayBook: boolean;
};

/** What is asked for: nothing yet, one crew's own stops, or all crews with stops that may change hands. */
type Better = null | { crewId: string; name: string } | 'all';

const nothingMoves = new Map<string, never>();

/** One day of all crews: the stops in order, the drive between them, the map, and a better order. */
export function DayScreen({ date, today, title, ground, mayBook }: DayScreenProps) {
  const router = useRouter();
  const [better, setBetter] = useState<Better>(null);
  const [lookedAt, setLookedAt] = useState<string | null>(null);
  const crewIds = better && better !== 'all' ? { crewIds: [better.crewId] } : {};
  const day = useDayPlan({ date });
  const offer = useDayPlan({ date, ...crewIds });
  const plan = better && offer.data ? offer.data : day.data;
  const crews = shownCrews(day.data?.now ?? [], better ? (offer.data?.better ?? []) : null);
  const moves = better && offer.data ? movesOfPlan(offer.data) : nothingMoves;
  const lines = useCrewLines(crews);
  const stopCount = crews.reduce((sum, { stops }) => sum + stops.length, 0);

  const go = (to: string) => router.push(paths.day(to));
  usePageKeys('Day', [
    { keys: 'ArrowLeft', words: 'The day before', run: () => go(addDays(date, -1)) },
    { keys: 'ArrowRight', words: 'The day after', run: () => go(addDays(date, 1)) },
    { keys: 't', words: 'Today', run: () => go(today) },
    { keys: 'p', words: 'Plan the day for all crews', run: () => mayBook && setBetter('all') },
    { keys: 'Escape', words: 'Leave the day as it is', run: () => setBetter(null) },
  ]);
  return (
    <div className="flex flex-col lg:h-[calc(100dvh-2rem)]">
      <TitleBlock
        level={1}
        title={title}
        meta={
          <div className="flex flex-wrap items-center gap-1 print:hidden">
            <LinkButton
              look="plain"
              href={paths.day(addDays(date, -1))}
              aria-label="The day before"
            >
              ←
            </LinkButton>
            <LinkButton look="plain" href={paths.day(today)}>
              today
            </LinkButton>
            <LinkButton look="plain" href={paths.day(addDays(date, 1))} aria-label="The day after">
              →
            </LinkButton>
            <LinkButton look="plain" href={paths.diaryOn(date)}>
              in the diary
            </LinkButton>
            {mayBook && stopCount > 1 && !better ? (
              <Button look="line" onClick={() => setBetter('all')} keyName="P">
                Plan the day for all crews
              </Button>
            ) : null}
          </div>
        }
      />
      {day.error || offer.error ? (
        <ErrorState title="The day could not be fetched">It is tried again by itself.</ErrorState>
      ) : null}
      <div className="grid min-h-0 flex-1 gap-5 pt-3 lg:grid-cols-[minmax(22rem,2fr)_3fr]">
        <div className="min-h-0 lg:overflow-y-auto lg:pr-2">
          {better && !offer.data && !offer.error ? (
            <p role="status" className="pb-3">
              Looking for a better order…
            </p>
          ) : null}
          {better && offer.data ? (
            <div className="pb-3">
              <PlanOffer
                key={better === 'all' ? 'all' : better.crewId}
                plan={offer.data}
                what={better === 'all' ? 'all crews' : better.name}
                onDone={() => setBetter(null)}
              />
            </div>
          ) : null}
          {day.isPending ? <DaySkeleton /> : null}
          {day.data && stopCount === 0 ? (
            <EmptyState title="Nobody goes out this day">
              Book a visit from the waiting list in the diary, and it stands here with its drive.
            </EmptyState>
          ) : null}
          {stopCount > 0
            ? crews.map((crew) => (
                <CrewDayList
                  key={crew.crewId}
                  {...{ crew, moves, lookedAt }}
                  isEstimated={plan?.isDriveEstimated ?? false}
                  onLook={setLookedAt}
                  onBetter={
                    mayBook && !better && crew.stops.filter(({ isFixed }) => !isFixed).length > 1
                      ? () => setBetter({ crewId: crew.crewId, name: crew.crewName })
                      : null
                  }
                />
              ))
            : null}
        </div>
        <section
          aria-label="Map of the day"
          className="min-h-80 max-lg:order-first max-lg:h-80 print:hidden"
        >
          <DayMap crews={mapCrews(crews, lines)} {...{ ground, lookedAt }} onLook={setLookedAt} />
        </section>
      </div>
    </div>
  );
}

/** Where one crew's order is looked at, the others stay as they stand. */
function shownCrews(now: readonly CrewDay[], better: readonly CrewDay[] | null): CrewDay[] {
  return now.map((crew) => better?.find(({ crewId }) => crewId === crew.crewId) ?? crew);
}

function mapCrews(crews: readonly CrewDay[], lines: ReturnType<typeof useCrewLines>): MapCrew[] {
  return crews.map((crew, index) => ({
    crewId: crew.crewId,
    name: crew.crewName,
    colour: crewColour(crew.colour),
    base: crew.stops.length > 0 ? crew.base : null,
    line: crew.stops.length > 0 ? (lines[index] ?? []) : [],
    stops: crew.stops.flatMap(({ visitId, place, customerName, street, timeWords }, at) =>
      place
        ? [
            {
              visitId,
              place,
              number: at + 1,
              label: `${at + 1}. ${customerName}, ${street}, ${timeWords}`,
            },
          ]
        : [],
    ),
  }));
}

function DaySkeleton() {
  return (
    <SkeletonScreen what="the day">
      {[1, 2, 3, 4].map((line) => (
        <Skeleton key={line} className="mb-3 h-20 w-full" />
      ))}
    </SkeletonScreen>
  );
}
