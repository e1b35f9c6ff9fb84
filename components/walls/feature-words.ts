import type { FeatureKind, ReadingOf } from '@/lib/contracts/wall-book';
import type { Choice } from './choice-sheet';

export const featureChoices: Choice<FeatureKind>[] = [
  { value: 'window', words: 'Window', hint: 'to the outside of its casing' },
  { value: 'door', words: 'Door', hint: 'to the outside of its casing' },
  { value: 'opening', words: 'Opening without a door' },
  { value: 'outlet', words: 'Outlet' },
  { value: 'switch', words: 'Switch' },
  { value: 'water', words: 'Water' },
  { value: 'waste', words: 'Waste' },
  { value: 'gas', words: 'Gas', hint: 'only the licensed trade moves it' },
  { value: 'vent', words: 'Vent' },
  { value: 'radiator', words: 'Radiator' },
  {
    value: 'panel',
    words: 'Electrical panel',
    hint: 'must stay reachable; ask the licensed trade',
  },
  { value: 'beam', words: 'Beam' },
  { value: 'pipe', words: 'Pipe' },
  { value: 'other', words: 'Something else' },
];

export const swingChoices: Choice<ReadingOf<'feature'>['swing']>[] = [
  { value: 'none', words: 'It does not open' },
  { value: 'in-left', words: 'Into the room, hinged left' },
  { value: 'in-right', words: 'Into the room, hinged right' },
  { value: 'out-left', words: 'Away, hinged left' },
  { value: 'out-right', words: 'Away, hinged right' },
];
