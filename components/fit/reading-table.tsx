import type { ReadingLine } from '@/lib/sheet/reading-lines';
import { InFractions } from './in-fractions';

/** Readings as they came in; one that was corrected or taken back stays, struck through. */
export function ReadingTable({ lines, caption }: { lines: ReadingLine[]; caption: string }) {
  if (lines.length === 0) return <p className="py-2 text-graphite">Nothing is read here yet.</p>;
  return (
    <table className="w-full border-collapse">
      <caption className="sr-only">{caption}</caption>
      <thead>
        <tr className="border-b border-ink text-left text-note text-graphite">
          <th scope="col" className="py-1 font-normal">
            reading
          </th>
          <th scope="col" className="px-2 text-right font-normal">
            came to
          </th>
          <th scope="col" className="px-2 font-normal">
            typed
          </th>
          <th scope="col" className="font-normal">
            by whom, with what
          </th>
        </tr>
      </thead>
      <tbody>
        {lines.map((line) => (
          <tr
            key={line.id}
            className={`border-b border-rule align-top *:py-1 ${line.stands ? '' : 'text-graphite line-through'}`}
          >
            <th scope="row" className="text-left font-normal">
              <InFractions words={line.what} />
              {line.stands ? null : <span className="sr-only"> (does not stand)</span>}
            </th>
            <td className="px-2 text-right">
              <InFractions words={line.came} />
            </td>
            <td className="px-2 text-graphite">
              <InFractions words={line.typed} />
            </td>
            <td className="text-note text-graphite">
              {[line.taken, line.tool].filter(Boolean).join(', ')}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
