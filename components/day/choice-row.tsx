type ChoiceRowProps<Value extends string> = {
  legend: string;
  choices: { value: Value; words: string }[];
  chosen: Value;
  onChoose: (value: Value) => void;
};

/** A few choices side by side, each as large as a thumb. */
export function ChoiceRow<Value extends string>(props: ChoiceRowProps<Value>) {
  return (
    <fieldset>
      <legend className="pb-1 font-medium">{props.legend}</legend>
      <div className="grid grid-cols-2 gap-2">
        {props.choices.map(({ value, words }) => (
          <button
            key={value}
            type="button"
            aria-pressed={value === props.chosen}
            onClick={() => props.onChoose(value)}
            className={`min-h-thumb touch-manipulation rounded border px-2 leading-tight active:bg-tint ${
              value === props.chosen ? 'border-2 border-pine bg-tint font-bold' : 'border-graphite'
            }`}
          >
            {words}
          </button>
        ))}
      </div>
    </fieldset>
  );
}
