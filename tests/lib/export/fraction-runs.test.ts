import { describe, expect, it } from 'vitest';
import { fractionRuns } from '@/lib/export/fraction-runs';

const told = (words: string) =>
  fractionRuns(words).map((run) => (run.isFraction ? `[${run.words}]` : run.words));

describe('fractionRuns', () => {
  it('sets each fraction apart from the words around it', () => {
    expect(told('blank 2 1/2" ± 1/16"')).toEqual(['blank 2\u2009', '[1⁄2]', '" ± ', '[1⁄16]', '"']);
  });

  it.each(['1 : 919', 'and/or', '63.5 mm', ''])('leaves %j as it is', (words) => {
    expect(told(words).join('')).toBe(words);
  });

  it('loses nothing but the slash and the space', () => {
    const plain = told('Filler 1 3/4", kick 4 11/16"').join('').replace(/[[\]]/g, '');
    expect(plain.replaceAll('⁄', '/').replaceAll('\u2009', ' ')).toBe(
      'Filler 1 3/4", kick 4 11/16"',
    );
  });
});
