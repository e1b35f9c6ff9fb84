'use client';

import { type ReactNode, useState } from 'react';
import { usePersonId } from '@/components/phone/phone-person';
import { Button } from '@/components/ui/button';
import { TitleStamp } from '@/components/ui/title-stamp';
import type { Reading } from '@/lib/contracts/readings';
import type { WallBookView } from '@/lib/contracts/rooms';
import { standingReadings } from '@/lib/measure/standing-readings';
import { readingWords } from '@/lib/walls-pad/reading-words';
import type { LengthSpeech } from '@/lib/walls-pad/say-length';
import { ChoiceSheet } from './choice-sheet';
import { FractionWords } from './fraction-words';
import { keepWithdrawal } from './keep-note';
import { OtherReaderWords } from './other-reader-words';
import type { PadHabits } from './pad-habits';
import { touchesWord, withdrawReasons } from './pad-words';
import { PlaceButton } from './place-button';
import { RoomFrame } from './room-frame';
import { useOtherReaders } from './use-other-readers';

type ReadingDetailProps = {
  reading: Reading;
  view: WallBookView;
  habits: PadHabits;
  speech: LengthSpeech;
  isHere: boolean;
  picture: ReactNode;
  onBack: () => void;
};

/** One reading: how it was taken; to be corrected, or taken back with a reason. Nothing is ever wiped out. */
export function ReadingDetail(props: ReadingDetailProps) {
  const { reading, view, habits, speech } = props;
  const personId = usePersonId();
  const othersOf = useOtherReaders(view, speech);
  const [isWithdrawing, setIsWithdrawing] = useState(false);
  const { room, readings } = view.wallBook;
  const { what, value } = readingWords(reading, room, speech);
  const stands = standingReadings(readings).some(({ id }) => id === reading.id);
  if (isWithdrawing) {
    return (
      <ChoiceSheet
        title="Why is it taken back?"
        choices={withdrawReasons}
        onBack={() => setIsWithdrawing(false)}
        onChoose={async (reason) => {
          const { toolId, id: readingId } = reading;
          await keepWithdrawal({ personId, roomId: room.id, toolId, habits, reason, readingId });
          setIsWithdrawing(false);
        }}
      >
        <FractionWords>{`${what}: ${value}`}</FractionWords>
      </ChoiceSheet>
    );
  }
  const others = stands ? othersOf(reading) : [];
  const by = view.readers.find(({ readingIds }) => readingIds.includes(reading.id))?.name;
  const tool = view.tools.find(({ id }) => id === reading.toolId)?.name ?? 'unknown';
  return (
    <RoomFrame picture={props.picture} title={<FractionWords>{what}</FractionWords>}>
      <p className="text-title font-bold">
        <FractionWords>{value}</FractionWords>
      </p>
      {stands ? null : (
        <p className="border-l-4 border-ochre bg-tint px-3 py-2">
          Corrected or taken back. It stays in the book and counts no more.
        </p>
      )}
      {others.length > 0 ? (
        <p className="border-l-4 border-blueprint bg-tint px-3 py-2">
          <OtherReaderWords others={others} />
          <span className="block text-note text-graphite">Both stay in the book.</span>
        </p>
      ) : null}
      <TitleStamp
        cells={[
          { label: 'typed', value: reading.typed || '–' },
          { label: 'tool', value: tool },
          { label: 'against', value: touchesWord(reading.touches, view.rules.region) },
          { label: 'taken', value: timeWords(reading.takenAt) },
          { label: 'by', value: by ?? 'you' },
          {
            label: 'where it is',
            value: props.isHere ? 'saved here, not sent yet' : 'with the office',
          },
        ]}
      />
      {stands ? (
        <div className="flex flex-col gap-2">
          <PlaceButton
            place={
              reading.kind === 'feature'
                ? { at: 'feature', wallId: reading.wallId, readingId: reading.id }
                : { at: 'correct', readingId: reading.id }
            }
          >
            Correct it
          </PlaceButton>
          <Button size="thumb" look="chalk" onClick={() => setIsWithdrawing(true)}>
            Take it back
          </Button>
        </div>
      ) : null}
      <Button size="thumb" look="plain" onClick={props.onBack}>
        Back
      </Button>
    </RoomFrame>
  );
}

function timeWords(instant: string): string {
  return new Date(instant).toLocaleString(undefined, {
    day: 'numeric',
    month: 'short',
    hour: '2-digit',
    minute: '2-digit',
  });
}
