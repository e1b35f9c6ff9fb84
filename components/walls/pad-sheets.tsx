'use client';

import type { Tool } from '@/lib/contracts/wall-book';
import type { ToolUse } from '@/lib/walls-pad/pad-tools';
import { toolsFor } from '@/lib/walls-pad/pad-tools';
import type { Region } from '@/lib/words/trade';
import { ChoiceSheet } from './choice-sheet';
import type { PadHabits } from './pad-habits';
import { doorwayNames, skipReasons, studSides, touchesChoices } from './pad-words';

export type PadSheet = 'tool' | 'touches' | 'skip' | 'set-up' | 'stud' | 'doorway' | 'rule';

type PadSheetsProps = {
  sheet: Exclude<PadSheet, 'set-up' | 'rule'>;
  tools: readonly Tool[];
  region: Region;
  toolId: string | undefined;
  use: ToolUse;
  habits: PadHabits;
  questionTitle: string;
  onHabits: (change: Partial<PadHabits>) => void;
  onSkip: (reason: string) => void;
  onClose: () => void;
};

/** What can be chosen from the pad, one sheet at a time. */
export function PadSheets({ sheet, tools, use, habits, onClose, ...props }: PadSheetsProps) {
  const choose = (change: Partial<PadHabits>) => {
    props.onHabits(change);
    onClose();
  };
  switch (sheet) {
    case 'tool':
      return (
        <ChoiceSheet
          title="Which tool?"
          choices={toolsFor(tools, use).map(({ id, name }) => ({ value: id, words: name }))}
          chosen={props.toolId}
          onChoose={(id) => choose({ toolIds: { ...habits.toolIds, [use]: id } })}
          onBack={onClose}
        />
      );
    case 'touches':
      return (
        <ChoiceSheet
          title="What does the tool touch?"
          choices={touchesChoices(props.region)}
          chosen={habits.touches}
          onChoose={(touches) => choose({ touches })}
          onBack={onClose}
        />
      );
    case 'stud':
      return (
        <ChoiceSheet
          title="Which part of the stud?"
          choices={studSides}
          chosen={habits.studAt}
          onChoose={(studAt) => choose({ studAt })}
          onBack={onClose}
        />
      );
    case 'doorway':
      return (
        <ChoiceSheet
          title="Which doorway?"
          choices={doorwayNames}
          chosen={habits.doorwayName}
          onChoose={(doorwayName) => choose({ doorwayName })}
          onBack={onClose}
        />
      );
    case 'skip':
      return (
        <ChoiceSheet
          title="Why can it not be taken?"
          choices={skipReasons(use)}
          onChoose={props.onSkip}
          onBack={onClose}
        >
          {props.questionTitle}
        </ChoiceSheet>
      );
  }
}
