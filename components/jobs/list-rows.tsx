'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Glyph } from '@/components/ui/glyph';
import type { ListRow } from '@/lib/contracts/job-lists';

/** Enough to see what is meant; the rest on request. */
const firstShown = 60;

/** The rows of a list, those with something to say first. */
export function ListRows({ rows }: { rows: readonly ListRow[] }) {
  const [showsAll, setShowsAll] = useState(false);
  const sorted = rows.toSorted((a, b) => weight(b) - weight(a) || a.row - b.row);
  const shown = showsAll ? sorted : sorted.slice(0, firstShown);
  return (
    <>
      <table className="w-full border-collapse text-left">
        <caption className="sr-only">Rows of the list, {rows.length}</caption>
        <thead>
          <tr className="border-b border-ink text-note">
            <th scope="col" className="w-16 py-1 pr-3 font-medium">
              Row
            </th>
            <th scope="col" className="py-1 pr-3 font-medium">
              Who and where
            </th>
            <th scope="col" className="py-1 font-medium">
              What becomes of it
            </th>
          </tr>
        </thead>
        <tbody>
          {shown.map((row) => (
            <tr key={row.row} className="border-b border-rule align-top">
              <td className="py-1.5 pr-3 tabular-nums text-graphite">{row.row}</td>
              <td className="py-1.5 pr-3">{row.words || 'nothing that was understood'}</td>
              <td className="py-1.5">
                <RowFate row={row} />
              </td>
            </tr>
          ))}
        </tbody>
      </table>
      {shown.length < rows.length ? (
        <Button look="line" className="mt-3" onClick={() => setShowsAll(true)}>
          Show all {rows.length} rows
        </Button>
      ) : null}
    </>
  );
}

function RowFate({ row }: { row: ListRow }) {
  if (row.problems.length > 0) {
    return (
      <ul className="text-chalk">
        {row.problems.map((problem) => (
          <li key={problem}>
            <Glyph name="problem" className="mr-1" />
            {problem}
          </li>
        ))}
      </ul>
    );
  }
  if (row.double) {
    return (
      <p className="text-ochre">
        <Glyph name="close" className="mr-1" />
        It has {row.double}.
      </p>
    );
  }
  return (
    <p className="text-moss">
      <Glyph name="within" className="mr-1" />
      begins a job
    </p>
  );
}

const weight = ({ problems, double }: ListRow) => (problems.length > 0 ? 2 : double ? 1 : 0);
