import Link from 'next/link';
import { classNames } from '@/components/ui/class-names';
import type { Figure, FigureKey, NumbersView } from '@/lib/contracts/numbers';
import { figureWords, valueWords } from '@/lib/numbers/figure-words';
import { paths } from '@/lib/paths';

type FigureListProps = { numbers: NumbersView; days: number; shown: FigureKey };

/** Every figure on one sheet, as a schedule on a drawing; each leads to the jobs behind it. */
export function FigureList({ numbers, days, shown }: FigureListProps) {
  return (
    <ul className="border-t border-rule">
      {numbers.figures.map((figure) => (
        <li key={figure.key} className="border-b border-rule">
          <Link
            href={paths.numbersOf(figure.key, days)}
            aria-current={figure.key === shown ? 'true' : undefined}
            className={classNames(
              'grid grid-cols-[1fr_auto] items-baseline gap-x-4 px-2 py-2 hover:bg-tint',
              figure.key === shown && 'border-l-4 border-ink bg-tint',
            )}
          >
            <span className="font-bold">{figureWords[figure.key].name}</span>
            <span className="text-lead font-bold tabular-nums">
              {valueWords(figure.value, figure.unit, numbers.currency)}
            </span>
            <span className="text-note text-graphite">{ofWords(figure)}</span>
          </Link>
        </li>
      ))}
    </ul>
  );
}

function ofWords({ key, unit, outOf }: Figure): string {
  const count = unit === 'hours' ? outOf.toFixed(1) : String(outOf);
  return figureWords[key].of.replace('#', count);
}
