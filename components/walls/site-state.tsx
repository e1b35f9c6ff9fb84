import { Button } from '@/components/ui/button';
import { TitleBlock } from '@/components/ui/title-block';
import type { LengthUnit } from '@/lib/units/brands';
import { type Region, tradeName } from '@/lib/words/trade';
import type { SketchDraft } from './sketch-draft';

type SiteStateProps = {
  draft: SketchDraft;
  unit: LengthUnit;
  region: Region;
  refusal: string | null;
  onDraft: (draft: SketchDraft) => void;
  onDone: () => void;
  onBack: () => void;
};

const names = ['Kitchen', 'Utility', 'Pantry', 'Bath', 'Laundry', 'Bar', 'Study', 'Hall'];

/** Boards and floors as sold in each world; common practice. */
const boardsMm = { in: [12.7, 15.875], mm: [12.5, 15, 27.5] };
const floorsMm = { in: [9.525, 19.05, 25.4], mm: [10, 15, 22, 65] };
const inchWords: Record<string, string> = {
  '9.525': '3/8 in',
  '12.7': '1/2 in',
  '15.875': '5/8 in',
  '19.05': '3/4 in',
  '25.4': '1 in',
};

/** The last of the drawing: what the room is called, and what is still to come on its faces. */
export function SiteState({
  draft,
  unit,
  region,
  refusal,
  onDraft,
  onDone,
  onBack,
}: SiteStateProps) {
  const words = (mm: number) =>
    mm === 0 ? 'none' : unit === 'in' ? (inchWords[String(mm)] ?? `${mm} mm`) : `${mm} mm`;
  const offered = (list: number[], chosen: number) =>
    [...new Set([0, ...list, chosen])].map((mm) => ({ value: mm, words: words(mm) }));
  return (
    <section className="flex flex-1 flex-col gap-4 px-3.5 py-4">
      <TitleBlock level={1} title="The room and its faces" />
      <Pick
        legend="Room"
        choices={names.map((name) => ({ value: name, words: name }))}
        chosen={draft.name}
        onPick={(name) => onDraft({ ...draft, name })}
      />
      <Pick
        legend={`${tradeName('board', region)} or plaster still to come on the walls`}
        choices={offered(boardsMm[unit], draft.wallThicknessToComeMm)}
        chosen={draft.wallThicknessToComeMm}
        onPick={(wallThicknessToComeMm) => onDraft({ ...draft, wallThicknessToComeMm })}
      />
      <Pick
        legend="Floor still to come"
        choices={offered(floorsMm[unit], draft.floorToComeMm)}
        chosen={draft.floorToComeMm}
        onPick={(floorToComeMm) => onDraft({ ...draft, floorToComeMm })}
      />
      {draft.floorToComeMm > 0 ? (
        <Pick
          legend="The cabinets will stand on"
          choices={[
            { value: 'finished-floor', words: 'the finished floor' },
            { value: 'rough-floor', words: 'the rough floor' },
          ]}
          chosen={draft.cabinetsStandOn}
          onPick={(cabinetsStandOn) => onDraft({ ...draft, cabinetsStandOn })}
        />
      ) : null}
      {refusal ? (
        <p role="alert" className="border-l-4 border-chalk bg-tint px-3 py-2">
          {refusal}
        </p>
      ) : null}
      <div className="mt-auto flex flex-col gap-2 pt-4">
        <Button size="thumb" onClick={onDone}>
          Start measuring
        </Button>
        <Button size="thumb" look="plain" onClick={onBack}>
          Back to the walls
        </Button>
      </div>
    </section>
  );
}

type PickProps<Value> = {
  legend: string;
  choices: { value: Value; words: string }[];
  chosen: Value;
  onPick: (value: Value) => void;
};

function Pick<Value extends string | number>({
  legend,
  choices,
  chosen,
  onPick,
}: PickProps<Value>) {
  return (
    <fieldset>
      <legend className="pb-1 font-medium">{legend}</legend>
      <div className="flex flex-wrap gap-2">
        {choices.map(({ value, words }) => (
          <button
            key={value}
            type="button"
            aria-pressed={value === chosen}
            onClick={() => onPick(value)}
            className={`min-h-thumb min-w-20 touch-manipulation rounded border px-3 ${
              value === chosen
                ? 'border-2 border-pine bg-tint font-bold'
                : 'border-graphite active:bg-tint'
            }`}
          >
            {words}
          </button>
        ))}
      </div>
    </fieldset>
  );
}
