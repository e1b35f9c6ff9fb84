/** What every figure of a fit is, how it comes about, in words, and what would make it surer. */
import { cutWords } from '@/lib/measure/explain-cuts';
import { heightWords } from '@/lib/measure/explain-heights';
import { roomWords } from '@/lib/measure/explain-room';
import { runWords } from '@/lib/measure/explain-run';
import type { FigureWords } from '@/lib/measure/figure-words';
import type { FigureKind } from '@/lib/measure/fit-figure';

/**
 * Each kind of figure in words, keyed as the fit marks it.
 *
 * Edge: every kind of figure has its words; the compiler holds that.
 * Example: `figureWords['filler-blank'].rounding` is 'up': a blank is cut down, never up.
 * Source: MEASURE sections 4 to 13 in DEVELOPERS.md; uncertainty JCGM 100:2008, k = 2.
 */
export const figureWords: Record<FigureKind, FigureWords> = {
  ...roomWords,
  ...runWords,
  ...heightWords,
  ...cutWords,
};
