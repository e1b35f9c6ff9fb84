'use client';

import { Suspense, useEffect, useRef, useState } from 'react';
import { keepDraft } from '@/components/phone/draft-store';
import type { RoomOnPhone } from '@/components/phone/room-store';
import type { WallBookView } from '@/lib/contracts/rooms';
import { IN_THE_WAY } from '@/lib/measure/in-the-way';
import { walkRoom } from '@/lib/measure/room-walk';
import { nextAsk, slotBefore, toGoWords } from '@/lib/walls-pad/next-ask';
import { photoFigures } from '@/lib/walls-pad/photo-figures';
import { readingWords } from '@/lib/walls-pad/reading-words';
import { type LengthSpeech, speechIn } from '@/lib/walls-pad/say-length';
import { type BookPlace, goTo, placeHref, useBookPlace } from './book-place';
import { AllRead, Waiting } from './book-states';
import { afterKey } from './draft-keys';
import type { KeptOnPhone } from './kept-on-phone';
import {
  FeaturePad,
  fetchScreens,
  LeaveScreen,
  PhotoScreen,
  ReadingDetail,
  SketchScreen,
  WallList,
  WallsOverview,
} from './lazy-screens';
import { useHabits } from './pad-habits';
import {
  freeKinds,
  freeQuestion,
  type PadQuestion,
  questionAgain,
  questionOfDiagonal,
  questionOfPlan,
  questionOfReading,
} from './pad-question';
import { QuestionPicture, WallPicture } from './question-picture';
import { ReadingPad } from './reading-pad';
import { usePlan } from './use-plan';

type BookScreensProps = { room: RoomOnPhone; kept: KeptOnPhone };

/** Which screen of the book is shown, by the address. */
export function BookScreens(props: BookScreensProps) {
  useEffect(() => {
    void fetchScreens();
  }, []);
  return (
    <Suspense fallback={<Waiting />}>
      <BookScreen {...props} />
    </Suspense>
  );
}

function BookScreen({ room, kept }: BookScreensProps) {
  const { view, queue } = room;
  const place = useBookPlace();
  const planned = usePlan(view);
  const [habits, changeHabits] = useHabits(kept.habits);
  const [afterSlot, setAfterSlot] = useState(kept.afterSlot);
  const [lastKeptId, setLastKeptId] = useState<string | null>(null);

  useScrollUp(placeHref(place));
  const roomId = view.wallBook.room.id;
  const speech = speechIn(view.rules, habits.unit);
  const isDrawn = view.wallBook.room.chains.length > 0;
  if (!isDrawn || place.at === 'sketch') {
    return (
      <SketchScreen
        view={view}
        keptSketch={kept.sketch}
        wallId={place.at === 'sketch' ? (place.wallId ?? null) : null}
        habits={habits}
        onHabits={changeHabits}
      />
    );
  }
  if (planned === null) return <Waiting />;
  const { plan, judge } = planned;

  const goOn = (slot: string | null) => {
    if (slot === null) return;
    setAfterSlot(slot);
    keepDraft(afterKey(roomId), slot);
  };
  const pad = (question: PadQuestion, { onward, back }: { onward: BookPlace; back: BookPlace }) => (
    <ReadingPad
      key={question.key}
      question={question}
      view={view}
      judge={judge}
      habits={habits}
      keptDraft={kept.draft}
      picture={<QuestionPicture {...{ question, view, speech }} />}
      toGo={toGoWords(plan)}
      lastKept={lastKeptWords(lastKeptId, view, speech)}
      onHabits={changeHabits}
      onKept={(reading, isAgain) => {
        setLastKeptId(reading.id);
        if (isAgain) return;
        goOn(question.slot);
        goTo(onward);
      }}
      onSkipped={(reason) => {
        const isAskedInPieces = question.ask.kind === 'length' && reason === IN_THE_WAY;
        goOn(isAskedInPieces ? slotBefore(plan, question.slot) : question.slot);
        goTo(onward);
      }}
      onBack={() => goTo(back)}
    />
  );
  const feature = (
    wallId: string,
    options: { askedSlot?: string; askedKind?: 'water' | 'waste'; readingId?: string },
  ) => {
    const corrects = view.wallBook.readings.find(({ id }) => id === options.readingId);
    return (
      <FeaturePad
        key={`${wallId}/${options.askedSlot ?? ''}/${options.readingId ?? ''}`}
        wallId={wallId}
        wallName={walkRoom(view.wallBook.room).byId.get(wallId)?.wall.name ?? '?'}
        askedKind={options.askedKind ?? null}
        corrects={corrects?.kind === 'feature' ? corrects : null}
        keptDraft={kept.draft}
        view={view}
        habits={habits}
        onHabits={changeHabits}
        onKept={() => {
          goOn(options.askedSlot ?? null);
          goTo(options.askedSlot ? { at: 'next' } : { at: 'wall', wallId });
        }}
        onBack={() => goTo({ at: 'wall', wallId })}
      />
    );
  };

  const beforeThis: BookPlace =
    lastKeptId === null ? { at: 'list' } : { at: 'correct', readingId: lastKeptId };
  const next: BookPlace = { at: 'next' };
  switch (place.at) {
    case 'next':
    case 'ask': {
      const asked =
        place.at === 'ask'
          ? plan.find(({ slot }) => slot === place.slot)
          : nextAsk(plan, afterSlot);
      if (!asked) {
        const settling =
          place.at === 'ask' ? questionOfDiagonal(place.slot, view.wallBook.room) : null;
        const leave: BookPlace = { at: 'leave' };
        return settling ? pad(settling, { onward: leave, back: leave }) : <AllRead />;
      }
      const { ask, slot } = asked;
      if (ask.kind === 'feature') {
        return feature(ask.wallId, { askedSlot: slot, askedKind: ask.feature });
      }
      const question = questionOfPlan(asked);
      return question ? pad(question, { onward: next, back: beforeThis }) : null;
    }
    case 'add': {
      const { kind, wallId } = place;
      const known = freeKinds.find((each) => each === kind);
      const options = { counterMm: view.rules.counterTopMm, speech };
      const question = known && freeQuestion(known, wallId, view.wallBook.room, options);
      if (!question) return <AllRead />;
      const back: BookPlace = wallId === '' ? { at: 'list' } : { at: 'wall', wallId };
      return pad(question, { onward: back, back });
    }
    case 'again':
    case 'correct':
    case 'reading': {
      const reading = view.wallBook.readings.find(({ id }) => id === place.readingId);
      if (!reading) return <AllRead />;
      if (place.at === 'again') {
        const again = questionAgain(reading, view.wallBook.room, speech);
        return again ? pad(again, { onward: { at: 'leave' }, back: { at: 'leave' } }) : <AllRead />;
      }
      const question = questionOfReading(reading, view.wallBook.room, speech);
      if (place.at === 'correct' && question) {
        return pad(question, { onward: next, back: { at: 'list' } });
      }
      return (
        <ReadingDetail
          key={reading.id}
          {...{ reading, view, habits, speech }}
          isHere={queue.some(({ id }) => id === reading.id)}
          picture={question ? <QuestionPicture {...{ question, view, speech }} /> : null}
          onBack={() => window.history.back()}
        />
      );
    }
    case 'wall':
      return (
        <WallList
          {...{ view, plan, speech }}
          wallId={place.wallId}
          hereIds={new Set(queue.map(({ id }) => id))}
          picture={<WallPicture {...{ view, speech }} wallId={place.wallId} />}
        />
      );
    case 'photo': {
      const { photoId, wallId } = place;
      const back: BookPlace = wallId === '' ? { at: 'list' } : { at: 'wall', wallId };
      return (
        <PhotoScreen
          key={photoId}
          photoId={photoId}
          figures={photoFigures(view.wallBook, wallId, speech)}
          onDone={() => goTo(back)}
        />
      );
    }
    case 'feature':
      return feature(place.wallId, { readingId: place.readingId });
    case 'list':
      return (
        <WallsOverview
          {...{ view, plan, speech, habits }}
          onHabits={changeHabits}
          picture={<WallPicture {...{ view, speech }} wallId={null} />}
        />
      );
    case 'leave':
      return <LeaveScreen {...{ view, plan, queue }} />;
  }
}

/** What was kept a moment ago, so that it can be seen once more and taken back up. */
function lastKeptWords(
  id: string | null,
  { wallBook }: WallBookView,
  speech: LengthSpeech,
): string | undefined {
  const reading = wallBook.readings.find((one) => one.id === id);
  if (!reading) return undefined;
  const { what, value } = readingWords(reading, wallBook.room, speech);
  return `${what}, ${value}. Back to correct it.`;
}

/** Another place of the book is another page: it begins at its top. */
function useScrollUp(href: string): void {
  const shown = useRef(href);
  useEffect(() => {
    if (shown.current === href) return;
    shown.current = href;
    window.scrollTo(0, 0);
  }, [href]);
}
