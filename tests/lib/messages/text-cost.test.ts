import { expect, test } from 'vitest';
import { textCostWords } from '@/lib/messages/text-cost';

test.each([
  [0, null, 'empty'],
  [1, null, '1 message'],
  [2, { perSegment: 0.008, currency: 'USD' }, '2 messages, 0.016 USD'],
  [3, { perSegment: 0.1, currency: 'EUR' }, '3 messages, 0.3 EUR'],
  [1, { perSegment: 0, currency: 'USD' }, '1 message, 0 USD'],
])('%i at %o is said as "%s"', (segments, price, words) =>
  expect(textCostWords(segments, price)).toBe(words),
);
