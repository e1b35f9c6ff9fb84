'use client';

import { useState } from 'react';
import { useTakeUp } from '@/components/sheet/use-take-up';
import { EmptyState } from '@/components/ui/empty-state';
import { FormError } from '@/components/ui/form-error';
import type { BenchSheet } from '@/lib/contracts/bench';
import type { SnagView } from '@/lib/contracts/snags';
import { BenchCard } from './bench-card';
import { BenchNotes } from './bench-notes';

type BenchScreenProps = {
  sheets: BenchSheet[];
  /** Open snags that the bench mends. */
  notes: SnagView[];
  mayTakeUp: boolean;
  maySayReady: boolean;
  mayBook: boolean;
};

const filters = ['all', 'to take up', 'in build', 'ready'] as const;
type Filter = (typeof filters)[number];

/** What the bench has to build, first need first, in letters that are read from two steps away. */
export function BenchScreen(props: BenchScreenProps) {
  const { sheets, notes, mayTakeUp, maySayReady, mayBook } = props;
  const { takeUp, isBusy, problem } = useTakeUp();
  const [filter, setFilter] = useState<Filter>('all');
  const shown = sheets.filter((sheet) => filter === 'all' || stateOf(sheet) === filter);
  return (
    <div className="flex flex-col gap-6 text-lead">
      <BenchNotes notes={notes} mayAnswer={maySayReady} />
      <section aria-label="Sheets to build" className="flex flex-col gap-4">
        <fieldset className="flex flex-wrap gap-2">
          <legend className="sr-only">Show</legend>
          {filters.map((name) => (
            <button
              key={name}
              type="button"
              aria-pressed={filter === name}
              onClick={() => setFilter(name)}
              className={`min-h-thumb rounded border px-4 ${
                filter === name ? 'border-2 border-pine bg-tint font-bold' : 'border-graphite'
              }`}
            >
              {name} {name === 'all' ? sheets.length : countOf(sheets, name)}
            </button>
          ))}
        </fieldset>
        <FormError problem={problem} />
        {shown.length === 0 ? (
          <EmptyState title="Nothing to build here">
            A sheet appears when a room’s fit is released. It starts with a site measure.
          </EmptyState>
        ) : (
          <ul className="flex flex-col gap-4">
            {shown.map((sheet) => (
              <li key={sheet.releaseId}>
                <BenchCard
                  sheet={sheet}
                  onTakeUp={mayTakeUp && !isBusy ? () => void takeUp(sheet.releaseId) : null}
                  maySayReady={maySayReady}
                  mayBook={mayBook}
                />
              </li>
            ))}
          </ul>
        )}
      </section>
    </div>
  );
}

function stateOf({ isReady, takenUpWords }: BenchSheet): Exclude<Filter, 'all'> {
  if (isReady) return 'ready';
  return takenUpWords ? 'in build' : 'to take up';
}

const countOf = (sheets: BenchSheet[], state: Filter) =>
  sheets.filter((sheet) => stateOf(sheet) === state).length;
