import type { ReactNode } from 'react';
import { TitleBlock } from '@/components/ui/title-block';
import type { Reading } from '@/lib/contracts/readings';
import type { WallBookView } from '@/lib/contracts/rooms';
import type { PlannedReading } from '@/lib/measure/missing-reading';
import { walkRoom } from '@/lib/measure/room-walk';
import { standingReadings } from '@/lib/measure/standing-readings';
import { wallIdsOf } from '@/lib/measure/wall-ids';
import { wallsOfPlanned } from '@/lib/walls-pad/ask-words';
import { isOpen } from '@/lib/walls-pad/next-ask';
import type { OtherReader } from '@/lib/walls-pad/other-readers';
import { readingWords } from '@/lib/walls-pad/reading-words';
import type { LengthSpeech } from '@/lib/walls-pad/say-length';
import { type Region, tradeWord } from '@/lib/words/trade';
import { type BookPlace, placeHref } from './book-place';
import { FractionWords } from './fraction-words';
import { LineLink } from './line-link';
import { OtherReaderWords } from './other-reader-words';
import { PlaceButton } from './place-button';
import { RoomFrame } from './room-frame';
import { useOtherReaders } from './use-other-readers';
import { WallPhotos } from './wall-photos';

type WallListProps = {
  wallId: string;
  view: WallBookView;
  plan: PlannedReading[];
  /** Still on this phone. */
  hereIds: ReadonlySet<string>;
  speech: LengthSpeech;
  picture: ReactNode;
};

/** One wall: what it still needs, what was read, and what may be added that nobody asked for. */
export function WallList({ wallId, view, plan, hereIds, speech, picture }: WallListProps) {
  const othersOf = useOtherReaders(view, speech);
  const { room, readings } = view.wallBook;
  const walked = walkRoom(room).byId.get(wallId);
  if (!walked) return null;
  const open = plan.filter((each) => isOpen(each) && wallsOfPlanned(each.ask)[0] === wallId);
  const read = standingReadings(readings).filter((reading) => wallIdsOf(reading)[0] === wallId);
  return (
    <RoomFrame
      picture={picture}
      title={`Wall ${walked.wall.name}`}
      meta={open.length === 0 ? 'all read' : `${open.length} to go`}
    >
      {open.length > 0 ? (
        <section>
          <TitleBlock title="To go" />
          <ul className="divide-y divide-rule">
            {open.map(({ slot, words }) => (
              <li key={slot}>
                <LineLink href={placeHref({ at: 'ask', slot })}>
                  <FractionWords>{words}</FractionWords>
                </LineLink>
              </li>
            ))}
          </ul>
        </section>
      ) : null}
      <WallPhotos roomId={room.id} wallId={wallId} place={`Wall ${walked.wall.name}`} />
      {read.length > 0 ? (
        <section>
          <TitleBlock title="Read" meta="touch one to correct it or take it back" />
          <ul className="divide-y divide-rule">
            {read.map((reading) => (
              <ReadLine
                key={reading.id}
                {...{ reading, view, speech, hereIds }}
                others={othersOf(reading)}
              />
            ))}
          </ul>
        </section>
      ) : null}
      <section>
        <TitleBlock title="Add" />
        <ul className="divide-y divide-rule">
          {addable(wallId, walked.before !== null, view.rules.region).map(({ words, place }) => (
            <li key={words}>
              <LineLink href={placeHref(place)} value="+">
                {words}
              </LineLink>
            </li>
          ))}
        </ul>
      </section>
      <PlaceButton look="plain" place={{ at: 'list' }}>
        The whole room
      </PlaceButton>
    </RoomFrame>
  );
}

function ReadLine({
  reading,
  view,
  speech,
  hereIds,
  others,
}: Pick<WallListProps, 'view' | 'speech' | 'hereIds'> & {
  reading: Reading;
  others: OtherReader[];
}) {
  const { what, value } = readingWords(reading, view.wallBook.room, speech);
  return (
    <li>
      <LineLink
        href={placeHref({ at: 'reading', readingId: reading.id })}
        value={<FractionWords>{value}</FractionWords>}
        note={hereIds.has(reading.id) ? 'saved here, not sent yet' : undefined}
      >
        <FractionWords>{what}</FractionWords>
        <OtherReaderWords others={others} />
      </LineLink>
    </li>
  );
}

function addable(
  wallId: string,
  hasCorner: boolean,
  region: Region,
): { words: string; place: BookPlace }[] {
  const add = (kind: string): BookPlace => ({ at: 'add', kind, wallId });
  return [
    {
      words: `A window, door, ${tradeWord('outlet', region)}, pipe …`,
      place: { at: 'feature', wallId },
    },
    { words: 'A stud', place: add('stud') },
    { words: 'Its length at another height', place: add('length') },
    { words: 'Its length in pieces, from mark to mark', place: add('pieces') },
    ...(hasCorner ? [{ words: 'The corner at its left, once more', place: add('corner') }] : []),
    { words: 'A gap to a plumb or straight line', place: add('face') },
    { words: 'The floor along it', place: add('floor') },
    { words: 'The ceiling along it', place: add('ceiling') },
  ];
}
