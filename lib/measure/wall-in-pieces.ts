/** A wall read in pieces: stretches from mark to mark that make up its whole length. */
import type { ReadingOf } from '@/lib/contracts/readings';
import type { Tool } from '@/lib/contracts/wall-book';
import { type BoundedEnds, lengthOwnPart, toolCommonPart } from '@/lib/measure/uncertainty';

/** The whole that the pieces make, mm. Example: 1210.5, 914.4 and 875.1 make 3000. */
export function wholeOfPieces({ piecesMm }: Pick<ReadingOf<'pieces'>, 'piecesMm'>): number {
  return piecesMm.reduce((sum, piece) => sum + piece, 0);
}

/**
 * Both parts of the standard u of the whole that the pieces make, mm: each piece errs for itself (√n times one
 * reading's own part), and one tape errs alike in all of them (their common parts added up).
 *
 * Edge: the first and the last piece butt against a corner with one end, the others go from mark to mark.
 * Example: a class II tape, step 1 mm, repeatability 0.3, pieces of 1210, 914 and 876 mm: own part √3 · 0.416 =
 * 0.721; common (0.3 + 0.4 + 0.2 + 0.3 + 0.2 + 0.3 + 0.2 + 0.2)/√3 = 2.1/√3 = 1.212.
 * Source: JCGM 100:2008, 5.2.2 (inputs that move together add up), F.1.2.3; Directive 2014/32/EU MI-008 (tapes).
 */
export function piecesUncertainty(
  tool: Tool,
  piecesMm: readonly number[],
): { uOwn: number; uCommon: number } {
  const last = piecesMm.length - 1;
  const common = piecesMm.map((piece, i) => {
    const ends: BoundedEnds = i === 0 || i === last ? 1 : 0;
    return toolCommonPart(tool, piece, ends);
  });
  return {
    uOwn: lengthOwnPart(tool) * Math.sqrt(piecesMm.length),
    uCommon: common.reduce((sum, part) => sum + part, 0),
  };
}
