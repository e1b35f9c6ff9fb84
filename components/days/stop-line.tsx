import Link from 'next/link';
import { KindMark } from '@/components/diary/kind-mark';
import { minutesWords, statusWords } from '@/components/diary/visit-words';
import { Verdict } from '@/components/ui/verdict';
import type { PlannedStop } from '@/lib/contracts/day-plans';
import { paths } from '@/lib/paths';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import type { StopMove } from './plan-moves';

/** One stop of a crew's day: the drive to it, when, the window promised, and how late it could be. */
export function StopLine({
  stop,
  number,
  move,
  isLookedAt,
  onLook,
}: {
  stop: PlannedStop;
  number: number;
  /** What a better order changes; nothing where it stays. */
  move: StopMove | undefined;
  isLookedAt: boolean;
  onLook: () => void;
}) {
  const { words, verdict } = statusWords[stop.status];
  const slack = Math.round(stop.slackMinutes);
  return (
    <li>
      <p className="border-l border-dashed border-graphite py-1 pl-3 text-note text-graphite ml-3">
        {Math.round(stop.driveMinutes)} min drive
      </p>
      <div
        className={`grid grid-cols-[1.75rem_minmax(0,1fr)] max-md:grid-cols-[2.5rem_minmax(0,1fr)] gap-x-2 rounded border px-2 py-1.5 ${
          isLookedAt ? 'border-blueprint outline-2 outline-blueprint' : 'border-rule'
        } ${move ? 'bg-tint' : 'bg-sheet'}`}
      >
        <button
          type="button"
          onClick={onLook}
          aria-pressed={isLookedAt}
          aria-label={`Show stop ${number}, ${stop.customerName}, on the map`}
          className="size-6 self-start rounded bg-[var(--crew)] text-note font-bold text-on-fill disabled:opacity-60 max-md:size-9"
        >
          {number}
        </button>
        <div className="min-w-0">
          <p className="flex flex-wrap items-baseline justify-between gap-x-3">
            <Link href={paths.job(stop.jobId)} className="font-bold hover:underline">
              <KindMark kind={stop.kind} isNamed /> {stop.customerName}
            </Link>
            <span className="font-bold">{stop.timeWords}</span>
          </p>
          <p className="text-note text-graphite">
            {visitKindWords[stop.kind]}, {stop.street}
            {stop.town ? `, ${stop.town}` : ''}
            {stop.place ? '' : ' · not on the map: drive guessed'}
          </p>
          <p className="flex flex-wrap items-baseline gap-x-3 text-note">
            <span>promised {stop.windowWords}</span>
            {stop.isFixed ? (
              <span className="text-graphite">stays where it is</span>
            ) : (
              <span className={slack < 15 ? 'text-ochre' : 'text-graphite'}>
                {slack > 0 ? `could be ${minutesWords(slack)} later` : 'not a minute later'}
              </span>
            )}
            <Verdict kind={verdict}>{words}</Verdict>
          </p>
          {move ? (
            <p className="text-note font-bold text-blueprint">
              was {move.wasTimeWords}
              {move.wasCrewName ? `, ${move.wasCrewName}` : ''}
            </p>
          ) : null}
        </div>
      </div>
    </li>
  );
}
