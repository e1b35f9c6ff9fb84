'use client';

import { newId } from '@/components/phone/new-id';
import type { PadAsk } from '@/lib/walls-pad/pad-fields';
import { ChoiceSheet } from './choice-sheet';
import type { SetUp } from './pad-habits';
import { faceSetUps } from './pad-words';

type SetUpSheetProps = {
  ask: Extract<PadAsk, { setUpGroup: string }>;
  title: string;
  onSetUp: (setUp: SetUp) => void;
  onBack: () => void;
};

/** Gaps, drops and rises compare only inside one set-up: it is begun knowingly, or taken up again. */
export function SetUpSheet({ ask, title, onSetUp, onBack }: SetUpSheetProps) {
  if (ask.kind === 'face') {
    return (
      <ChoiceSheet
        title="Set up the line"
        choices={faceSetUps}
        onChoose={(setUpKind) => onSetUp({ setUpId: newId(), setUpKind })}
        onBack={onBack}
      >
        <p>{title}. Every gap of this set-up is read from the same line: do not move it between.</p>
      </ChoiceSheet>
    );
  }
  const before = ask.setUpId;
  const begin = { value: 'new', words: 'It stands: begin', hint: 'a new level line' } as const;
  const goOn = {
    value: 'same',
    words: 'It has not moved: go on',
    hint: 'the level line of the readings before',
  } as const;
  return (
    <ChoiceSheet<'new' | 'same'>
      title="Set up the level"
      choices={before === null ? [begin] : [goOn, begin]}
      onChoose={(choice) =>
        onSetUp({
          setUpId: choice === 'same' && before !== null ? before : newId(),
          setUpKind: 'laser-plane',
        })
      }
      onBack={onBack}
    >
      <p>
        Stand the level laser where it sees every wall. Floor and ceiling are read from this one
        line; never look into the laser.
      </p>
    </ChoiceSheet>
  );
}
