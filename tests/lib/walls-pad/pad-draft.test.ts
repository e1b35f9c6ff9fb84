import { describe, expect, it } from 'vitest';
import type { PlannedReading } from '@/lib/measure/missing-reading';
import { nextAsk, toGoWords } from '@/lib/walls-pad/next-ask';
import { draftInUnit, freshDraft, nextField } from '@/lib/walls-pad/pad-draft';
import { entryOfLength, entryText, pressKey, pressTick } from '@/lib/walls-pad/pad-entry';
import { type PadAsk, padFields } from '@/lib/walls-pad/pad-fields';
import { toolInHand, toolsFor } from '@/lib/walls-pad/pad-tools';
import { exampleLevel, exampleTape, wallIds } from '@/tests/help/wall-book-examples';

const corner: PadAsk = {
  kind: 'corner',
  cornerWallId: wallIds.B,
  zMm: 910,
  nominalDeg: 90,
  legMm: 914.4,
  carriedPast: false,
};
const doorway: PadAsk = { kind: 'doorway' };

describe('freshDraft', () => {
  it('begins a corner at the diagonal, its legs marked off as the plan says', () => {
    const draft = freshDraft('q', corner, padFields(corner), 'in', 'legs');
    expect(draft.active).toBe('diagonal');
    expect(entryText(draft.entries.legLeft ?? entryOfLength(0, 'in'))).toBe('36');
  });

  it('begins a corner by angle at the angle, in degrees', () => {
    const draft = freshDraft('q', corner, padFields(corner, 'angle'), 'in', 'angle');
    expect(draft).toMatchObject({ active: 'angle', entries: { angle: { unit: 'deg' } } });
  });
});

describe('nextField', () => {
  const fields = padFields(doorway);
  const fresh = freshDraft('q', doorway, fields, 'mm', 'legs');
  const withValues = (active: string, ...names: string[]) => ({
    ...fresh,
    active,
    entries: {
      ...fresh.entries,
      ...Object.fromEntries(names.map((name) => [name, entryOfLength(800, 'mm')])),
    },
  });

  it('goes from field to field', () => {
    expect(nextField(fields, withValues('clearWidth', 'clearWidth'))).toBe('clearHeight');
  });

  it('offers an optional field once', () => {
    const both = ['clearWidth', 'clearHeight'];
    expect(nextField(fields, withValues('clearHeight', ...both))).toBe('passageWidth');
    expect(nextField(fields, withValues('passageWidth', ...both))).toBeNull();
  });

  it('goes back to a required field that was left empty', () => {
    expect(nextField(fields, withValues('passageWidth', 'clearWidth'))).toBe('clearHeight');
  });
});

describe('draftInUnit', () => {
  it('keeps the digits being typed and the lengths that stood there', () => {
    const fields = padFields(corner);
    let draft = freshDraft('q', corner, fields, 'in', 'legs');
    const typed = pressTick(pressKey(entryOfLength(127 * 25.4, 'in'), '3'), 8);
    draft = { ...draft, entries: { ...draft.entries, diagonal: typed } };
    const metric = draftInUnit(draft, fields, 'mm');
    expect(metric.entries.diagonal).toMatchObject({ unit: 'mm', whole: '1273', sixtyFourths: 0 });
    expect(metric.entries.legLeft).toEqual(entryOfLength(914.4, 'mm'));
  });
});

describe('nextAsk', () => {
  const planned = (slot: string, change: Partial<PlannedReading> = {}): PlannedReading => ({
    slot,
    words: slot,
    why: '',
    need: 'must',
    ask: doorway,
    takenBy: [],
    skipped: null,
    ...change,
  });
  const taken = { takenBy: ['r'] };
  const skipped = { skipped: { readingId: 's', reason: 'blocked' } };

  it('offers the first open one at the start', () => {
    expect(nextAsk([planned('a', taken), planned('b')], null)?.slot).toBe('b');
  });

  it('goes on in walking order and comes round to what was passed over', () => {
    const plan = [planned('a'), planned('b', taken), planned('c', taken)];
    expect(nextAsk(plan, 'b')?.slot).toBe('a');
    expect(nextAsk([planned('a'), planned('b', taken), planned('c')], 'b')?.slot).toBe('c');
  });

  it('does not offer what was skipped, nor anything when all is taken', () => {
    expect(nextAsk([planned('a', taken), planned('b', skipped)], 'a')).toBeNull();
  });

  it('counts what is to go of all that is asked', () => {
    expect(toGoWords([planned('a', taken), planned('b'), planned('c')])).toBe('2 of 3 to go');
    expect(toGoWords([planned('a', taken), planned('b', skipped)])).toBe('all read');
  });
});

describe('toolInHand', () => {
  const tools = [exampleLevel, exampleTape];

  it('takes the best suited tool until another is chosen', () => {
    expect(toolInHand(tools, 'length', undefined)?.id).toBe(exampleTape.id);
    expect(toolInHand(tools, 'face', undefined)?.id).toBe(exampleLevel.id);
    expect(toolInHand(tools, 'length', exampleLevel.id)?.id).toBe(exampleLevel.id);
  });

  it('offers every tool, suited ones first', () => {
    expect(toolsFor(tools, 'stud').map(({ id }) => id)).toEqual([exampleTape.id, exampleLevel.id]);
  });

  it('has nothing in hand in a shop without tools', () => {
    expect(toolInHand([], 'length', undefined)).toBeNull();
  });
});
