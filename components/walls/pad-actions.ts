import type { PadAsk } from '@/lib/walls-pad/pad-fields';
import type { Region } from '@/lib/words/trade';
import type { PadAction } from './field-pad';
import type { PadHabits, SetUp } from './pad-habits';
import type { PadSheet } from './pad-sheets';
import { setUpWord, studSides, touchesWord } from './pad-words';

type PadActionsInput = {
  ask: PadAsk;
  habits: PadHabits;
  toolName: string;
  setUp: SetUp | null;
  canSkip: boolean;
  region: Region;
  onBack: () => void;
  onSheet: (sheet: PadSheet) => void;
};

/** The row between the figure and the keys: back, tool, what this kind of reading needs to be told, skip. */
export function padActions(input: PadActionsInput): PadAction[] {
  const { toolName, canSkip, onBack, onSheet } = input;
  const actions: PadAction[] = [
    { key: 'back', label: '‹ back', onPress: onBack },
    { key: 'tool', label: 'tool', value: toolName, onPress: () => onSheet('tool') },
    ownAction(input),
  ];
  if (canSkip) {
    actions.push({ key: 'skip', label: 'can’t reach it', onPress: () => onSheet('skip') });
  }
  return actions;
}

function ownAction({ ask, habits, setUp, region, onSheet }: PadActionsInput): PadAction {
  switch (ask.kind) {
    case 'stud': {
      const value = studSides.find((side) => side.value === habits.studAt)?.words ?? '';
      return { key: 'stud', label: 'to', value, onPress: () => onSheet('stud') };
    }
    case 'doorway':
      return {
        key: 'doorway',
        label: 'door',
        value: habits.doorwayName,
        onPress: () => onSheet('doorway'),
      };
    case 'face': {
      const value = setUpWord(setUp?.setUpKind ?? ask.setUpKind);
      return { key: 'set-up', label: 'set-up', value, onPress: () => onSheet('set-up') };
    }
    case 'floor':
    case 'ceiling':
      return { key: 'set-up', label: 'laser', value: 'moved?', onPress: () => onSheet('set-up') };
    default: {
      const value = touchesWord(habits.touches, region);
      return { key: 'touches', label: 'against', value, onPress: () => onSheet('touches') };
    }
  }
}
