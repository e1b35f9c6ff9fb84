import { Button } from '@/components/ui/button';
import { KeyHint } from '@/components/ui/key-hint';
import type { CrewView } from '@/lib/contracts/visits';
import { visitKinds } from '@/lib/schedule/visit-kind';
import { visitKindWords } from '@/lib/schedule/visit-kind-words';
import { crewColour } from './crew-colour';
import type { DiaryFilter } from './diary-filter';
import { KindMark } from './kind-mark';

/** The key above the diary, which is also its filter: what is ticked is shown. */
export function CrewKey({ crews, filter }: { crews: readonly CrewView[]; filter: DiaryFilter }) {
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-1 py-2 text-note print:hidden">
      {crews.map((crew) => (
        <label key={crew.id} className="inline-flex min-h-6 cursor-pointer items-center gap-1.5">
          <input
            type="checkbox"
            className="size-3.5 accent-current"
            style={{ color: crewColour(crew.colour), accentColor: crewColour(crew.colour) }}
            checked={filter.showsCrew(crew.id)}
            onChange={() => filter.toggleCrew(crew.id)}
          />
          {crew.name}
        </label>
      ))}
      <details className="relative">
        <summary className="min-h-6 cursor-pointer text-graphite hover:text-ink">Kinds</summary>
        <div className="absolute left-0 z-20 mt-1 w-48 rounded border border-ink bg-sheet p-2">
          {visitKinds.map((kind) => (
            <label key={kind} className="flex min-h-7 cursor-pointer items-center gap-2">
              <input
                type="checkbox"
                className="size-3.5 accent-pine"
                checked={filter.showsKind(kind)}
                onChange={() => filter.toggleKind(kind)}
              />
              <KindMark kind={kind} isNamed /> {visitKindWords[kind]}
            </label>
          ))}
        </div>
      </details>
      <label className="inline-flex min-h-6 cursor-pointer items-center gap-1.5">
        <input
          type="checkbox"
          className="size-3.5 accent-ochre"
          checked={filter.onlyOpen}
          onChange={filter.toggleOnlyOpen}
        />
        <span className="border border-dashed border-graphite px-1">no answer yet</span> only
        <KeyHint keys="N" />
      </label>
      {filter.isAnythingHidden ? (
        <Button look="plain" className="min-h-6 px-1 py-0 text-note" onClick={filter.showAll}>
          Some are hidden: show all
        </Button>
      ) : null}
    </div>
  );
}
