import type { FeatureKind, ReadingOf } from '@/lib/contracts/readings';
import { featureName } from '@/lib/words/feature-words';
import { type Region, tradeWord } from '@/lib/words/trade';
import type { Choice } from './choice-sheet';

/** What may be on a wall, as it is called where the shop is. */
export const featureChoices = (region: Region): Choice<FeatureKind>[] => [
  {
    value: 'window',
    words: 'Window',
    hint: `to the outside of its ${tradeWord('casing', region)}`,
  },
  { value: 'door', words: 'Door', hint: `to the outside of its ${tradeWord('casing', region)}` },
  { value: 'opening', words: 'Opening without a door' },
  { value: 'outlet', words: featureName('outlet', region) },
  { value: 'switch', words: 'Switch' },
  { value: 'water', words: 'Water' },
  { value: 'waste', words: featureName('waste', region) },
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
