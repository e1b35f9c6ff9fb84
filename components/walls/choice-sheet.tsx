import type { ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { TitleBlock } from '@/components/ui/title-block';

export type Choice<Value> = { value: Value; words: string; hint?: string };

type ChoiceSheetProps<Value> = {
  title: string;
  children?: ReactNode;
  choices: Choice<Value>[];
  chosen?: Value;
  onChoose: (value: Value) => void;
  onBack: (() => void) | null;
};

/** One choice a screen, by large lines; nothing is typed. */
export function ChoiceSheet<Value extends string>(props: ChoiceSheetProps<Value>) {
  return (
    <section className="flex flex-1 flex-col px-3.5 py-4">
      <TitleBlock level={1} title={props.title} />
      {props.children ? <div className="py-2 text-graphite">{props.children}</div> : null}
      <ul className="divide-y divide-rule border-b border-rule">
        {props.choices.map(({ value, words, hint }) => (
          <li key={value}>
            <button
              type="button"
              aria-pressed={props.chosen === undefined ? undefined : value === props.chosen}
              onClick={() => props.onChoose(value)}
              className={`flex min-h-thumb w-full touch-manipulation flex-col justify-center px-2 py-1.5 text-left text-lead active:bg-tint ${
                value === props.chosen ? 'border-l-4 border-pine font-bold' : ''
              }`}
            >
              {words}
              {hint ? <span className="text-note font-normal text-graphite">{hint}</span> : null}
            </button>
          </li>
        ))}
      </ul>
      {props.onBack ? (
        <Button look="plain" size="thumb" className="mt-2" onClick={props.onBack}>
          Back
        </Button>
      ) : null}
    </section>
  );
}
