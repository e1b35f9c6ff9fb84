import { useId } from 'react';
import { TextField } from '@/components/ui/text-field';

/** The shop's time zone: the browser's own to begin with, any other by typing a part of its name. */
export function ZoneField({ start, error }: { start: string; error?: string }) {
  const listId = useId();
  return (
    <>
      <TextField
        label="The shop's time zone"
        name="zone"
        list={listId}
        defaultValue={start}
        autoComplete="off"
        hint="Every time in the diary and in messages is this zone's."
        required
        error={error}
      />
      {start ? (
        <datalist id={listId}>
          {Intl.supportedValuesOf('timeZone').map((zone) => (
            <option key={zone} value={zone} />
          ))}
        </datalist>
      ) : null}
    </>
  );
}
