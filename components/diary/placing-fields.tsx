import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import type { CrewView } from '@/lib/contracts/visits';
import type { ProblemDetails } from '@/lib/problem-details';
import { minutesWords } from './visit-words';

export type Placing = { crewId: string; date: string; time: string; workMinutes: number };

/** Who, which day, when, how long: the same four for booking and for moving. */
export function PlacingFields({
  crews,
  placing,
  onChange,
  problem,
}: {
  crews: readonly CrewView[];
  placing: Placing;
  onChange: (placing: Placing) => void;
  problem: ProblemDetails | null;
}) {
  const change = (part: Partial<Placing>) => onChange({ ...placing, ...part });
  return (
    <div className="grid grid-cols-2 gap-3">
      <SelectField
        label="Crew"
        options={crews.map((crew) => ({
          value: crew.id,
          label: `${crew.name} (${crew.people.map((person) => person.name.split(' ')[0]).join(', ')})`,
        }))}
        value={placing.crewId}
        onChange={(event) => change({ crewId: event.target.value })}
        error={problem?.errors?.crewId}
        required
      />
      <TextField
        label="Minutes of work on site"
        hint={minutesWords(placing.workMinutes)}
        type="number"
        min={10}
        step={5}
        value={placing.workMinutes}
        onChange={(event) => change({ workMinutes: Number(event.target.value) })}
        error={problem?.errors?.workMinutes}
        required
      />
      <TextField
        label="Day"
        type="date"
        value={placing.date}
        onChange={(event) => change({ date: event.target.value })}
        error={problem?.errors?.date}
        required
      />
      <TextField
        label="Starts"
        type="time"
        step={900}
        value={placing.time}
        onChange={(event) => change({ time: event.target.value })}
        error={problem?.errors?.time}
        required
      />
    </div>
  );
}
