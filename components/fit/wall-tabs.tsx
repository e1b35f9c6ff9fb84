import Link from 'next/link';
import { Glyph } from '@/components/ui/glyph';
import type { Room } from '@/lib/contracts/wall-book';
import type { Fit, WallFit } from '@/lib/measure/fit';
import { wallsOf } from '@/lib/sheet/room-names';

type WallTabsProps = {
  room: Room;
  fit: Fit;
  chosenId: string;
  hrefOf: (wallId: string) => string;
};

/** The walls in walking order; each with the worst that was found on it. */
export function WallTabs({ room, fit, chosenId, hrefOf }: WallTabsProps) {
  return (
    <nav aria-label="Walls" className="flex flex-wrap gap-1 print:hidden">
      {wallsOf(room).map(({ wall }) => {
        const fitted = fit.walls.find(({ wallId }) => wallId === wall.id);
        const worst = fitted ? worstOf(fitted, fit) : null;
        const isChosen = wall.id === chosenId;
        return (
          <Link
            key={wall.id}
            href={hrefOf(wall.id)}
            scroll={false}
            aria-current={isChosen ? 'true' : undefined}
            className={`inline-flex min-h-9 min-w-11 items-center justify-center gap-1.5 rounded border px-2.5 ${
              isChosen
                ? 'border-ink bg-ink font-bold text-paper'
                : 'border-rule bg-sheet hover:border-pine'
            }`}
          >
            <span className="sr-only">Wall </span>
            {wall.name}
            {worst ? (
              <span className={isChosen ? '' : worst === 'over' ? 'text-chalk' : 'text-ochre'}>
                <Glyph name={worst} />
                <span className="sr-only">, {worst}</span>
              </span>
            ) : null}
          </Link>
        );
      })}
    </nav>
  );
}

/** Of the wall itself and of the runs on it. */
function worstOf({ wallId, verdicts }: WallFit, fit: Fit): 'over' | 'close' | null {
  const runs = fit.runs.filter((run) => run.wallId === wallId);
  const all = [...verdicts, ...runs.flatMap((run) => run.verdicts)].map(({ verdict }) => verdict);
  if (all.includes('over') || runs.some(({ fill }) => fill?.verdict === 'short')) return 'over';
  const isClose = runs.some(({ fill }) => fill?.verdict === 'tight' || fill?.verdict === 'loose');
  return all.includes('close') || isClose ? 'close' : null;
}
