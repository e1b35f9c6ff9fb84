import type { ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { LinkButton } from '@/components/ui/link-button';
import { TitleBlock } from '@/components/ui/title-block';
import type { WallBookView } from '@/lib/contracts/rooms';
import type { PlannedReading } from '@/lib/measure/missing-reading';
import { standingReadings } from '@/lib/measure/standing-readings';
import { paths } from '@/lib/paths';
import { wallsOfPlanned } from '@/lib/walls-pad/ask-words';
import { isOpen, toGoWords } from '@/lib/walls-pad/next-ask';
import { readingWords } from '@/lib/walls-pad/reading-words';
import type { LengthSpeech } from '@/lib/walls-pad/say-length';
import { placeHref } from './book-place';
import { FractionWords } from './fraction-words';
import { LineLink } from './line-link';
import { OtherReaderWords } from './other-reader-words';
import type { PadHabits } from './pad-habits';
import { PlaceButton } from './place-button';
import { RoomFrame } from './room-frame';
import { useOtherReaders } from './use-other-readers';
import { WallPhotos } from './wall-photos';

type WallsOverviewProps = {
  view: WallBookView;
  plan: PlannedReading[];
  speech: LengthSpeech;
  habits: PadHabits;
  onHabits: (change: Partial<PadHabits>) => void;
  picture: ReactNode;
};

/** The whole room: each wall with what it still needs, what lies across, and the ways on. */
export function WallsOverview(props: WallsOverviewProps) {
  const { view, plan, speech, habits, onHabits, picture } = props;
  const othersOf = useOtherReaders(view, speech);
  const { room, readings } = view.wallBook;
  const walls = room.chains.flatMap((chain) => chain.walls);
  const acrossPlan = plan.filter(({ ask }) => wallsOfPlanned(ask).length !== 1);
  const across = standingReadings(readings).filter(({ kind }) =>
    ['diagonal', 'width', 'doorway'].includes(kind),
  );
  return (
    <RoomFrame picture={picture} title={room.name} meta={toGoWords(plan)}>
      <PlaceButton place={{ at: 'next' }}>
        {plan.some(isOpen) ? 'Go on measuring' : 'Back to the pad'}
      </PlaceButton>
      <section>
        <TitleBlock title="Walls" />
        <ul className="divide-y divide-rule">
          {walls.map((wall) => (
            <li key={wall.id}>
              <LineLink
                href={placeHref({ at: 'wall', wallId: wall.id })}
                value={countWords(plan.filter(({ ask }) => wallsOfPlanned(ask)[0] === wall.id))}
              >
                Wall {wall.name}
              </LineLink>
            </li>
          ))}
        </ul>
      </section>
      <section>
        <TitleBlock title="Across, and the way in" />
        <ul className="divide-y divide-rule">
          {acrossPlan.filter(isOpen).map(({ slot, words }) => (
            <li key={slot}>
              <LineLink href={placeHref({ at: 'ask', slot })} value="to go">
                <FractionWords>{words}</FractionWords>
              </LineLink>
            </li>
          ))}
          {across.map((reading) => {
            const { what, value } = readingWords(reading, room, speech);
            return (
              <li key={reading.id}>
                <LineLink
                  href={placeHref({ at: 'reading', readingId: reading.id })}
                  value={<FractionWords>{value}</FractionWords>}
                >
                  {what}
                  <OtherReaderWords others={othersOf(reading)} />
                </LineLink>
              </li>
            );
          })}
          <li>
            <LineLink href={placeHref({ at: 'add', kind: 'doorway', wallId: '' })} value="+">
              A doorway on the way in
            </LineLink>
          </li>
        </ul>
      </section>
      <WallPhotos roomId={room.id} wallId={null} place={room.name} />
      <div className="flex flex-col gap-2">
        <PlaceButton look="line" place={{ at: 'leave' }}>
          Before you leave
        </PlaceButton>
        {speech.unit === 'in' ? (
          <Button
            size="thumb"
            look="plain"
            aria-pressed={habits.goesOn}
            onClick={() => onHabits({ goesOn: !habits.goesOn })}
          >
            {habits.goesOn ? 'Goes on by itself after the fraction' : 'Waits for next every time'}
          </Button>
        ) : null}
        <PlaceButton look="plain" place={{ at: 'sketch' }}>
          Change the drawing
        </PlaceButton>
        <LinkButton size="thumb" look="plain" href={paths.today()}>
          Today
        </LinkButton>
      </div>
    </RoomFrame>
  );
}

function countWords(planned: PlannedReading[]): string {
  const open = planned.filter(isOpen).length;
  return open === 0 ? 'done' : `${open} to go`;
}
