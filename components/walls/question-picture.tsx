import type { WallBookView } from '@/lib/contracts/rooms';
import { wallsOfAsk } from '@/lib/walls-pad/ask-words';
import type { LengthSpeech } from '@/lib/walls-pad/say-length';
import { placeHref } from './book-place';
import type { PadQuestion } from './pad-question';
import { PlanPicture } from './plan-picture';

const hrefOfWall = (wallId: string) => placeHref({ at: 'wall', wallId });

/** The plan with what a question is about drawn thick. */
export function QuestionPicture({
  question: { ask },
  view,
  speech,
}: {
  question: PadQuestion;
  view: WallBookView;
  speech: LengthSpeech;
}) {
  const across =
    ask.kind === 'diagonal'
      ? { fromId: ask.fromCornerWallId, toId: ask.toCornerWallId, isWidth: false }
      : ask.kind === 'width'
        ? { fromId: ask.wallId, toId: ask.toWallId, isWidth: true }
        : null;
  return (
    <PlanPicture
      book={view.wallBook}
      speech={speech}
      currentWallIds={wallsOfAsk(ask, view.wallBook.room)}
      currentCornerId={ask.kind === 'corner' ? ask.cornerWallId : null}
      across={across}
      hrefOfWall={hrefOfWall}
    />
  );
}

export function WallPicture({
  view,
  speech,
  wallId,
}: {
  view: WallBookView;
  speech: LengthSpeech;
  wallId: string | null;
}) {
  return (
    <PlanPicture
      book={view.wallBook}
      speech={speech}
      currentWallIds={wallId === null ? [] : [wallId]}
      hrefOfWall={hrefOfWall}
    />
  );
}
