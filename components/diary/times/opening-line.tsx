import { crewColour } from '@/components/diary/crew-colour';
import { KeyHint } from '@/components/ui/key-hint';
import type { Opening } from '@/lib/contracts/openings';
import type { CrewView } from '@/lib/contracts/visits';

/** One time that works: when, who, what it costs in driving, and why it is offered. */
export function OpeningLine({
  opening,
  number,
  crew,
  isChosen,
  onChoose,
  onBook,
}: {
  opening: Opening;
  number: number;
  crew: CrewView | undefined;
  isChosen: boolean;
  onChoose: () => void;
  onBook: () => void;
}) {
  const drive = Math.round(opening.driveAddedMinutes);
  return (
    <li>
      <button
        type="button"
        aria-pressed={isChosen}
        onClick={onChoose}
        onDoubleClick={onBook}
        style={{ borderLeftColor: crew ? crewColour(crew.colour) : undefined }}
        className={`block w-full rounded border border-l-[5px] px-2.5 py-1.5 text-left max-lg:min-h-thumb ${
          isChosen
            ? 'border-blueprint bg-sheet outline-2 outline-blueprint'
            : 'border-rule bg-sheet hover:border-ink'
        }`}
      >
        <span className="flex items-baseline justify-between gap-2">
          <span className="font-bold">
            {opening.dayWords}, {opening.windowWords}
          </span>
          <KeyHint keys={String(number)} />
        </span>
        <span className="flex justify-between gap-2 text-note">
          <span>{opening.crewName}</span>
          <span className="text-graphite">
            {drive > 0 ? `+${drive} min drive` : 'no drive added'}
            {opening.isDriveEstimated ? ', estimated' : ''}
          </span>
        </span>
        <span className="block text-note text-graphite">{opening.why}</span>
        {opening.missedWishes.length > 0 ? (
          <span className="block text-note text-ochre">
            Misses a wish: {opening.missedWishes.join(', ')}
          </span>
        ) : null}
      </button>
    </li>
  );
}
