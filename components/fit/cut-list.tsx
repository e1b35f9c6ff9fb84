import { Fragment } from 'react';
import { Glyph } from '@/components/ui/glyph';
import type { CutRow } from '@/lib/sheet/cut-list';
import type { Revised } from '@/lib/sheet/revision-marks';
import { Figure } from './figure';
import { InFractions } from './in-fractions';
import { Surely } from './surely';

type CutListProps = {
  rows: CutRow[];
  /** On a released sheet: what stood there before, struck, with the letter of the revision. */
  revised?: Revised | null;
};

/** What the bench cuts, run by run: face at top and bottom, the blank, how sure. Every figure opens. */
export function CutList({ rows, revised = null }: CutListProps) {
  if (rows.length === 0) {
    return <p className="py-2 text-graphite">Nothing to cut yet: lay out a run first.</p>;
  }
  const runNames = [...new Set(rows.map(({ runName }) => runName))];
  return (
    <table className="w-full border-collapse">
      <caption className="sr-only">Cut list</caption>
      <thead>
        <tr className="border-b border-ink text-note text-graphite">
          <th scope="col" className="py-1 text-left font-normal">
            piece
          </th>
          <th scope="col" className="px-2 py-1 text-right font-normal">
            top, left
          </th>
          <th scope="col" className="px-2 py-1 text-right font-normal">
            bottom, right
          </th>
          <th scope="col" className="px-2 py-1 text-right font-normal">
            cut
          </th>
          <th scope="col" className="py-1 text-right font-normal">
            <abbr title="give or take, k = 2" className="no-underline">
              ±
            </abbr>
          </th>
        </tr>
      </thead>
      <tbody>
        {runNames.map((runName) => (
          <Fragment key={runName}>
            <tr>
              <th scope="rowgroup" colSpan={5} className="pt-2.5 text-left font-bold">
                {runName}
              </th>
            </tr>
            {rows
              .filter((row) => row.runName === runName)
              .map((row) => (
                <CutLine key={row.key} row={row} change={changeOf(row, revised)} />
              ))}
          </Fragment>
        ))}
      </tbody>
    </table>
  );
}

type Change = { revision: string; was: string | null };

function changeOf({ key }: CutRow, revised: Revised | null): Change | null {
  const mark = revised?.marks.find((one) => one.on === 'cut' && one.key === key);
  return revised && mark ? { revision: revised.revision, was: mark.was } : null;
}

function CutLine({ row, change }: { row: CutRow; change: Change | null }) {
  const of = `${row.piece}, ${row.runName}`;
  return (
    <tr className="border-b border-rule align-top *:py-1.5 print:*:py-0.5">
      <th scope="row" className="pr-2 text-left font-normal">
        {row.piece}
        <span className={`block text-note ${row.isWrong ? 'text-chalk' : 'text-graphite'}`}>
          {row.isWrong ? <Glyph name="over" className="mr-1" /> : null}
          <InFractions words={row.note} />
        </span>
      </th>
      <td className="px-2 text-right">
        {row.first ? <Figure figure={row.first} of={`${of}, top or left`} /> : null}
      </td>
      <td className="px-2 text-right">
        {row.last ? <Figure figure={row.last} of={`${of}, bottom or right`} /> : null}
      </td>
      <td className="px-2 text-right whitespace-nowrap">
        {change ? <CutChange change={change} /> : null}
        {row.how === 'leave long' ? <span className="text-note text-graphite">leave </span> : null}
        <Figure figure={row.cut} of={of} isStrong />
      </td>
      <td className="text-right">
        <Surely figure={row.cut} />
      </td>
    </tr>
  );
}

/** The letter in its triangle, and what stood there, struck through; "new" where nothing did. */
function CutChange({ change: { revision, was } }: { change: Change }) {
  return (
    <span className="mr-1.5 text-note text-chalk">
      <span aria-hidden="true">△</span>
      <b>{revision}</b>{' '}
      {was === null ? (
        'new'
      ) : (
        <>
          <span className="sr-only">was </span>
          <s className="text-graphite">
            <InFractions words={was} />
          </s>
        </>
      )}
    </span>
  );
}
