import type { ReactNode } from 'react';
import { EmptyState } from '@/components/ui/empty-state';
import { TitleBlock } from '@/components/ui/title-block';
import type { Figure } from '@/lib/contracts/numbers';
import { figureWords, splitWords, valueWords } from '@/lib/numbers/figure-words';
import { apiPaths } from '@/lib/paths';
import { FigureJobs } from './figure-jobs';
import { LazyChart } from './lazy-chart';

type FigureDetailProps = {
  figure: Figure;
  currency: string;
  days: number;
  /** What can be done about this figure, before the jobs behind it. */
  children?: ReactNode;
};

/** One figure: how it is counted, what it is made of, drawn and as a table, and the jobs behind it. */
export function FigureDetail({ figure, currency, days, children }: FigureDetailProps) {
  const words = figureWords[figure.key];
  return (
    <section>
      <TitleBlock
        title={words.name}
        meta={valueWords(figure.value, figure.unit, currency)}
        id="figure"
      />
      <p className="max-w-prose py-2 text-graphite">{words.how}</p>
      {figure.caution ? (
        <p className="border-l-4 border-ochre bg-tint px-3 py-2">{figure.caution}</p>
      ) : null}
      {figure.splits.length > 0 ? (
        <div className="grid gap-x-8 gap-y-3 py-3 xl:grid-cols-2">
          <LazyChart splits={figure.splits} />
          <table className="self-start">
            <caption className="sr-only">{words.name}, its parts</caption>
            <tbody>
              {figure.splits.map((split) => (
                <tr key={split.name} className="border-b border-rule">
                  <th scope="row" className="py-1 pr-4 text-left font-normal">
                    {split.name}
                  </th>
                  <td className="py-1 text-right tabular-nums">
                    {splitWords(split, figure.unit, currency)}
                  </td>
                </tr>
              ))}
            </tbody>
          </table>
        </div>
      ) : null}
      {children}
      {figure.lines.length > 0 ? (
        <>
          <TitleBlock
            level={3}
            title={linesTitle(figure)}
            meta={
              <a className="link" href={apiPaths.numbersFile(figure.key, days)} download>
                Save as CSV
              </a>
            }
          />
          <FigureJobs
            figure={figure.key}
            lines={figure.lines.map((line, place) => ({
              ...line,
              place,
              valueWords: line.value === null ? '' : valueWords(line.value, figure.unit, currency),
            }))}
          />
        </>
      ) : (
        <EmptyState title="Nothing to show for these days">
          It fills by itself as visits are booked, answered and made.
        </EmptyState>
      )}
    </section>
  );
}

/** A share opens to what fell out of it, every other figure to what it is made of. */
function linesTitle({ unit, lines }: Figure): string {
  const count = lines.length === 1 ? '1 line' : `${lines.length} lines`;
  return unit === 'share' ? `What missed: ${count}` : `What it is made of: ${count}`;
}
