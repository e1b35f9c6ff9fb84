import { expect, test } from 'vitest';
import { missingWords } from '@/lib/messages/missing-words';

test('what is ticked comes before their own words, in their language', () => {
  expect(missingWords(['floor', 'away'], ' tiles come on Friday ', 'en')).toBe(
    'the floor; nobody at home that day; tiles come on Friday',
  );
  expect(missingWords(['power'], '', 'es')).toBe('la electricidad');
});

test('nothing ticked and no words say nothing', () => {
  expect(missingWords([], '  ', 'en')).toBe('');
});
