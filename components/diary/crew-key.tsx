import type { CrewView } from '@/lib/contracts/visits';
import { crewColour } from './crew-colour';
import { KindMark } from './kind-mark';

/** The key above the calendar, which is also its filter: a crew's box ticked is a crew shown. */
export function CrewKey({
  crews,
  shownCrewIds,
  onToggle,
}: {
  crews: readonly CrewView[];
  shownCrewIds: ReadonlySet<string>;
  onToggle: (crewId: string) => void;
}) {
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-1 py-2 text-note">
      {crews.map((crew) => (
        <label key={crew.id} className="inline-flex cursor-pointer items-center gap-1.5">
          <input
            type="checkbox"
            className="size-3.5 accent-current"
            style={{ color: crewColour(crew.colour), accentColor: crewColour(crew.colour) }}
            checked={shownCrewIds.has(crew.id)}
            onChange={() => onToggle(crew.id)}
          />
          {crew.name}
        </label>
      ))}
      <span className="text-graphite">
        dashed: no answer yet · <KindMark kind="site-measure" isNamed /> measure ·{' '}
        <KindMark kind="install" isNamed /> install · <KindMark kind="return" isNamed /> return
      </span>
    </div>
  );
}
