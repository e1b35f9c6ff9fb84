import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { chosenNumber } from '@/lib/messages/chosen-number';

describe('which of the visits', () => {
  test.each([
    ['1', 1],
    [' 2. ', 2],
    ['(2)', 2],
    ['No. 2', 2],
    ['Number 1 please', 1],
    ['two', 2],
    ['the second one, please', 2],
    ['La segunda, por favor', 2],
    ['Dos', 2],
  ])('"%s" is %i of two', (text, chosen) => expect(chosenNumber(text, 2)).toBe(chosen));

  test.each([
    '0',
    '3',
    '12',
    '1 or 2',
    '2 but later',
    'yes',
    'one of my dogs is ill',
    '',
    '½',
    '1.5',
  ])('"%s" chooses none of two', (text) => expect(chosenNumber(text, 2)).toBeNull());

  test('is one of those that were asked about, or none, whatever is written', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', maxLength: 40 }), (text) => {
        const chosen = chosenNumber(text, 3);
        expect(chosen === null || [1, 2, 3].includes(chosen)).toBe(true);
      }),
    );
  });
});
