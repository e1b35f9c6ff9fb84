import { crewColour } from '@/components/diary/crew-colour';
import { EmptyState } from '@/components/ui/empty-state';
import type { CrewView } from '@/lib/contracts/visits';

export function CrewList({ crews }: { crews: CrewView[] }) {
  if (crews.length === 0) {
    return (
      <EmptyState title="No crew yet">
        A visit is booked with a crew: add one that measures and one that installs.
      </EmptyState>
    );
  }
  return (
    <ul>
      {crews.map((crew) => (
        <li key={crew.id} className="flex items-baseline gap-3 border-b border-rule py-2">
          <span
            aria-hidden="true"
            className="size-3 shrink-0 self-center rounded"
            style={{ background: crewColour(crew.colour) }}
          />
          <b>{crew.name}</b>
          <span className="text-graphite">{crew.does === 'measure' ? 'measures' : 'installs'}</span>
          <span className="ml-auto">{crew.people.map((person) => person.name).join(', ')}</span>
        </li>
      ))}
    </ul>
  );
}
