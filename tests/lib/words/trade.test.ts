import { describe, expect, it } from 'vitest';
import { featureName, featureWord } from '@/lib/words/feature-words';
import { spanishTradeWord, tradeName, tradeTerms, tradeWord } from '@/lib/words/trade';

describe('the words of the trade', () => {
  it.each([
    ['counter', 'countertop', 'worktop', 'benchtop'],
    ['kick', 'toe kick', 'plinth', 'kickboard'],
    ['board', 'drywall', 'plasterboard', 'plasterboard'],
    ['outlet', 'outlet', 'socket', 'power point'],
  ] as const)(
    'call the %s a %s in the US, a %s in the UK, a %s in Australia',
    (term, us, uk, au) => {
      expect(tradeWord(term, 'US')).toBe(us);
      expect(tradeWord(term, 'UK')).toBe(uk);
      expect(tradeWord(term, 'EU')).toBe(uk);
      expect(tradeWord(term, 'AU')).toBe(au);
    },
  );

  it('have a word in every region and in Spanish, and a capital at the beginning of a line', () => {
    for (const term of tradeTerms) {
      for (const region of ['US', 'UK', 'AU', 'EU'] as const) {
        expect(tradeWord(term, region)).toMatch(/^[a-z]/);
        expect(tradeName(term, region)).toMatch(/^[A-Z]/);
        expect(spanishTradeWord(term, region)).toMatch(/^[a-záéíóú]/);
      }
    }
  });

  it('call a top in Spanish as it is called where the shop is', () => {
    expect(spanishTradeWord('counter', 'US')).toBe('cubierta');
    expect(spanishTradeWord('counter', 'EU')).toBe('encimera');
  });

  it('name what is on a wall', () => {
    expect(featureWord('outlet', 'UK')).toBe('socket');
    expect(featureName('waste', 'US')).toBe('Drain');
    expect(featureName('window', 'AU')).toBe('Window');
  });
});
