import type { ReadingOf, Touches } from '@/lib/contracts/readings';
import { IN_THE_WAY } from '@/lib/measure/in-the-way';
import type { ToolUse } from '@/lib/walls-pad/pad-tools';
import { type Region, tradeName, tradeWord } from '@/lib/words/trade';
import type { Choice } from './choice-sheet';

/** What the tool may touch, as it is called where the shop is. */
export const touchesChoices = (region: Region): Choice<Touches>[] => [
  { value: 'board', words: tradeName('board', region) },
  { value: 'plaster', words: 'Plaster' },
  { value: 'tile', words: 'Tile' },
  {
    value: 'bare-stud',
    words: 'Bare stud',
    hint: `the ${tradeWord('board', region)} to come is added`,
  },
  { value: 'skirting', words: tradeName('skirting', region) },
  { value: 'casing', words: tradeName('casing', region) },
  { value: 'existing-cabinet', words: 'A cabinet that stands already' },
];

export const touchesWord = (touches: Touches, region: Region): string =>
  touchesChoices(region)
    .find(({ value }) => value === touches)
    ?.words.replace(/ that.*/, '') ?? touches;

const otherSkips: Choice<string>[] = [
  'Not built yet',
  'No safe way to reach it',
  'The customer asked us not to',
  'The tool for it is not here',
  'Not needed: no cabinet comes here',
].map((words) => ({ value: words, words }));

/** Why a question is left; a length that something stands in the way of is asked for in pieces. */
export const skipReasons = (use: ToolUse): Choice<string>[] => [
  {
    value: IN_THE_WAY,
    words: IN_THE_WAY,
    ...(use === 'length' ? { hint: 'then it is asked for in pieces, mark to mark' } : {}),
  },
  ...otherSkips,
];

export const withdrawReasons: Choice<string>[] = [
  'Misread',
  'Wrong wall or place',
  'Typed wrong',
  'The tool slipped or was knocked',
  'Taken twice by mistake',
].map((words) => ({ value: words, words }));

type SetUpKind = ReadingOf<'face'>['setUpKind'];
export const faceSetUps: Choice<SetUpKind>[] = [
  { value: 'plumb-level', words: 'Level held plumb', hint: 'straight and plumb' },
  { value: 'laser-plane', words: 'Upright laser line', hint: 'straight and plumb, the whole wall' },
  { value: 'straightedge', words: 'Straightedge', hint: 'straight only, not plumb' },
];

export const setUpWord = (kind: SetUpKind): string =>
  faceSetUps.find(({ value }) => value === kind)?.words ?? kind;

export const studSides: Choice<ReadingOf<'stud'>['at']>[] = [
  { value: 'centre', words: 'Its centre' },
  { value: 'left-edge', words: 'Its left edge' },
  { value: 'right-edge', words: 'Its right edge' },
];

export const doorwayNames: Choice<string>[] = [
  'Front door',
  'Back door',
  'Hall',
  'Door of the room',
  'Stairs',
  'Lift',
].map((words) => ({ value: words, words }));
