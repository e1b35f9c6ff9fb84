import { FieldError } from '@/components/ui/field-error';
import { controlLook } from '@/components/ui/field-frame';
import type { WallText } from './check-wall';

const places = [0, 1, 2, 3, 4, 5, 6];

type GapFieldsProps = {
  text: WallText;
  errors: (string | undefined)[];
  onGap: (place: number, gap: string) => void;
};

/** Seven gaps side by side, as they lie behind the straightedge; an empty one was not read. */
export function GapFields({ text, errors, onGap }: GapFieldsProps) {
  return (
    <fieldset className="pb-3">
      <legend className="pb-1 font-medium">
        Gaps behind it, {text.way === 'along' ? 'left to right' : 'from the foot up'}
      </legend>
      <div className="grid grid-cols-7 gap-1">
        {places.map((place) => (
          <input
            key={place}
            type="text"
            aria-label={`Gap ${place + 1}`}
            aria-invalid={errors[place] ? true : undefined}
            value={text.gaps[place] ?? ''}
            onChange={(event) => onGap(place, event.target.value)}
            autoComplete="off"
            className={`${controlLook} px-1! text-center`}
          />
        ))}
      </div>
      <FieldError error={errors.find(Boolean)} />
    </fieldset>
  );
}
