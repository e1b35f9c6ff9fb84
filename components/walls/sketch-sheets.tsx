import type { Wall } from '@/lib/contracts/wall-book';
import { ChoiceSheet } from './choice-sheet';

type CornerSheetProps = {
  wall: Wall;
  onCorner: (deg: number) => void;
  onOther: () => void;
  onBack: () => void;
};

/** How the corner at a wall's left turns, inside the room. */
export function CornerSheet({ wall, onCorner, onOther, onBack }: CornerSheetProps) {
  return (
    <ChoiceSheet<'90' | '270' | '135' | '225' | 'other'>
      title={`Corner at the left of wall ${wall.name}`}
      chosen={String(wall.leftCornerDeg ?? '') as '90'}
      choices={[
        { value: '90', words: '90°', hint: 'inside corner' },
        { value: '270', words: '270°', hint: 'outside corner, as of a chimney breast' },
        { value: '135', words: '135°', hint: 'blunt, as in a bay' },
        { value: '225', words: '225°', hint: 'blunt, turning away' },
        { value: 'other', words: 'Another angle' },
      ]}
      onChoose={(choice) => (choice === 'other' ? onOther() : onCorner(Number(choice)))}
      onBack={onBack}
    />
  );
}

type WallChangeSheetProps = {
  wall: Wall;
  canRemove: boolean;
  onAdd: (cornerDeg: number) => void;
  onBreast: () => void;
  onBay: () => void;
  onRemove: () => void;
  onStartOver: (() => void) | null;
  onBack: () => void;
};

export function WallChangeSheet({ wall, canRemove, onStartOver, ...props }: WallChangeSheetProps) {
  const choices = [
    { value: 'add-90', words: 'One wall more after it', hint: 'round an inside corner' },
    { value: 'add-270', words: 'One wall more after it', hint: 'round an outside corner' },
    { value: 'breast', words: 'A chimney breast on it', hint: 'stands into the room' },
    { value: 'bay', words: 'A bay in it', hint: 'goes out of the room' },
    ...(canRemove ? [{ value: 'remove', words: 'Take this wall away' }] : []),
    ...(onStartOver ? [{ value: 'over', words: 'Start over with another shape' }] : []),
  ];
  return (
    <ChoiceSheet
      title={`Wall ${wall.name}`}
      choices={choices}
      onChoose={(choice) => {
        if (choice === 'add-90') props.onAdd(90);
        else if (choice === 'add-270') props.onAdd(270);
        else if (choice === 'breast') props.onBreast();
        else if (choice === 'bay') props.onBay();
        else if (choice === 'remove') props.onRemove();
        else onStartOver?.();
      }}
      onBack={props.onBack}
    />
  );
}
