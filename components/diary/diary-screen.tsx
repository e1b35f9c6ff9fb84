'use client';

import { useMemo, useState } from 'react';
import { ErrorState } from '@/components/ui/error-state';
import { LinkButton } from '@/components/ui/link-button';
import type { Opening } from '@/lib/contracts/openings';
import type { CrewView, VisitView, WaitingItem } from '@/lib/contracts/visits';
import { paths } from '@/lib/paths';
import type { Region } from '@/lib/time/text-locale';
import type { WorkingPattern } from '@/lib/time/workdays';
import { BookDialog } from './book-dialog';
import { CrewKey } from './crew-key';
import { useDiaryFilter } from './diary-filter';
import { DiaryHead } from './diary-head';
import { DiaryLocale } from './diary-locale';
import { DiarySheet } from './diary-sheet';
import { useDiaryView } from './diary-view';
import { localStart } from './local-start';
import { placeOf } from './place';
import { RefusedMoveDialog } from './refused-move-dialog';
import { ghostVisit } from './times/ghost-visit';
import { TimesPanel } from './times/times-panel';
import { subjectOfItem, subjectOfVisit, type TimesSubject } from './times/times-subject';
import { useDiaryKeys } from './use-diary-keys';
import { useDiaryRange } from './use-diary-range';
import { useMover } from './use-mover';
import { useTimesAsked } from './use-times-asked';
import { useYesByPhone } from './use-yes-by-phone';
import { VisitDialog } from './visit-dialog';
import { useVisits } from './visits-query';
import { WaitingList } from './waiting-list';
import { useWaiting } from './waiting-query';

export type DiaryScreenProps = {
  zone: string;
  region: Region;
  today: string;
  /** Local date to open on, today unless the address says otherwise. */
  startOn: string;
  pattern: WorkingPattern;
  crews: CrewView[];
  mayBook: boolean;
};

type Booking = { item: WaitingItem; date: string; time: string; crewId?: string };

/** The diary beside its waiting list: the scheduler's whole screen. */
export function DiaryScreen(props: DiaryScreenProps) {
  const { zone, region, today, startOn, pattern, crews, mayBook } = props;
  const locale = useMemo(() => ({ language: 'en', region }) as const, [region]);
  const [shown, show] = useDiaryView();
  const range = useDiaryRange(startOn, shown, locale);
  const filter = useDiaryFilter(crews);
  const mover = useMover({ zone, pattern, crews });
  const { data, error } = useVisits(range);
  const visits = useMemo(
    () => mover.draw((data ?? []).filter(filter.shows)),
    [data, filter.shows, mover.draw],
  );
  const [openedId, setOpenedId] = useState<string | null>(null);
  const [booking, setBooking] = useState<Booking | null>(null);
  const opened = data?.find(({ id }) => id === openedId) ?? null;
  const [subject, setSubject] = useState<TimesSubject | null>(null);
  const [looked, setLooked] = useState<Opening | null>(null);
  const ghost = useMemo(
    () => (subject && looked ? ghostVisit(subject, looked) : null),
    [subject, looked],
  );
  const sayYes = useYesByPhone();
  const waiting = useWaiting();
  // Times that are looked for unfold it, until they are settled.
  const isAsideShown = subject !== null || !shown.isListFolded;

  const itemOf = (of: Pick<TimesSubject, 'jobId' | 'kind'>) =>
    waiting.all?.find(({ jobId, kind }) => jobId === of.jobId && kind === of.kind);
  const openTimes = (item: WaitingItem) => {
    if (mayBook) setSubject(subjectOfItem(item));
  };
  useTimesAsked(waiting.all, openTimes);
  const openBooking = (item: WaitingItem, at: Partial<Booking> = {}) =>
    setBooking({
      item,
      date: at.date ?? (item.from && item.from > today ? item.from : today),
      time: at.time ?? pattern.dayStart,
      ...(at.crewId ? { crewId: at.crewId } : {}),
    });
  const dropWaiting = (key: string, at: Partial<Booking>) => {
    const item = waiting.all?.find(({ jobId, kind }) => `${jobId}/${kind}` === key);
    if (item) openBooking(item, at);
  };
  const original = (visit: VisitView) => data?.find(({ id }) => id === visit.id) ?? visit;

  const onVisitKey = useDiaryKeys({
    today,
    range,
    show,
    isListFolded: shown.isListFolded,
    toggleOnlyOpen: filter.toggleOnlyOpen,
    shop: { pattern, crews },
    visitOf: (id) => data?.find((visit) => visit.id === id),
    nudge: mayBook ? mover.nudge : null,
    sayYes,
    anotherTime: (visit) => setSubject(subjectOfVisit(visit)),
    openWaiting: (index) => {
      const item = waiting.shown[index];
      if (item) openTimes(item);
    },
  });

  return (
    <DiaryLocale value={locale}>
      <div
        className={`diary-sheet grid gap-6 lg:h-[calc(100dvh-2rem)] print:block print:h-auto ${
          isAsideShown ? 'lg:grid-cols-[minmax(0,1fr)_20rem]' : ''
        }`}
      >
        <section aria-label="Diary" className="flex min-h-[70dvh] min-w-0 flex-col lg:min-h-0">
          <DiaryHead
            title={range.title}
            shown={shown}
            onShow={show}
            onEarlier={() => range.step(-1)}
            onToday={() => range.goTo(today)}
            onLater={() => range.step(1)}
          />
          <CrewKey crews={crews} filter={filter} />
          {error ? (
            <ErrorState title="The diary could not be fetched">
              What is shown may be old. It is tried again by itself.
            </ErrorState>
          ) : null}
          <DiarySheet
            {...{ zone, today, pattern, shown, range, visits, mayBook, onVisitKey }}
            crews={crews}
            shownCrews={filter.shownCrews}
            ghost={ghost}
            onOpen={({ id }) => setOpenedId(id)}
            onDay={(date) => {
              range.goTo(date);
              show({ view: 'day' });
            }}
            onMove={(visit, change) =>
              mover.send(original(visit), { ...placeOf(original(visit), zone), ...change })
            }
            onDropWaiting={dropWaiting}
          />
        </section>
        <aside
          className={`flex min-h-0 flex-col border-rule lg:border-l lg:pl-5 print:hidden ${
            isAsideShown ? '' : 'lg:hidden'
          }`}
        >
          {subject ? (
            <TimesPanel
              today={today}
              visitDate={subject.visit ? placeOf(subject.visit, zone).date : null}
              key={`${subject.jobId}/${subject.kind}/${subject.visit?.id ?? ''}`}
              subject={subject}
              crews={crews}
              workdays={pattern.workdays}
              onLook={(opening) => {
                setLooked(opening);
                if (opening) range.goTo(opening.date);
              }}
              onByHand={() => {
                const item = itemOf(subject);
                setSubject(null);
                if (subject.visit) setOpenedId(subject.visit.id);
                else if (item) openBooking(item, looked ?? {});
              }}
              onBooked={(date) => {
                setSubject(null);
                waiting.setTyped('');
                range.goTo(date);
              }}
              onClose={() => setSubject(null)}
            />
          ) : (
            <WaitingList
              waiting={waiting}
              mayBook={mayBook}
              isCalendarShown={shown.view !== 'crews' && shown.view !== 'list'}
              onTimes={openTimes}
              onFold={() => show({ isListFolded: true })}
              onFound={(visit) => {
                range.goTo(localStart(visit.startsAt, zone).date);
                setOpenedId(visit.id);
              }}
            />
          )}
          {mayBook && !subject ? (
            <LinkButton look="line" href={paths.slip()} className="mt-2 self-start">
              The shop is late…
            </LinkButton>
          ) : null}
        </aside>
        {booking ? (
          <BookDialog
            item={booking.item}
            crews={crews}
            start={booking}
            onClose={() => setBooking(null)}
            onBooked={(date) => {
              setBooking(null);
              range.goTo(date);
            }}
          />
        ) : null}
        {opened ? (
          <VisitDialog
            visit={opened}
            start={placeOf(opened, zone)}
            crews={crews}
            mayBook={mayBook}
            onAnotherTime={() => {
              setOpenedId(null);
              setSubject(subjectOfVisit(opened));
            }}
            onRefused={mover.askAgain}
            onClose={() => setOpenedId(null)}
          />
        ) : null}
        {mover.refused ? (
          <RefusedMoveDialog
            refused={mover.refused}
            crews={crews}
            onClose={mover.forgetRefused}
            onAgain={(visit, place, reason) => {
              mover.forgetRefused();
              void mover.send(visit, place, reason);
            }}
          />
        ) : null}
      </div>
    </DiaryLocale>
  );
}
