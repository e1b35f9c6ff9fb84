import { describe, expect, it } from 'vitest';
import { sourceFiles, withoutComments } from '../help/source-files';

/** Words that mean one thing in one region only: each stands in lib/words/trade.ts and nowhere else. */
const regional =
  /\b(countertops?|worktops?|benchtops?|toe[ -]kicks?|plinths?|kickboards?|drywall|plasterboard|sheetrock|power points?|skirting boards?|baseboards?|architraves?|splashbacks?|backsplash(es)?)\b/i;
/** The same as a caption: an id in small letters is no word that anybody reads. */
const caption = /['"`>]\s*(Outlet|Socket|Skirting|Casing|Drain|Cooker|Fridge)\b/;
/** An id of a kind of visit, and its key in a record. */
const ids = /'worktop-template'/g;

const asRead = (text: string) => withoutComments(text).replace(ids, "''");

describe('words that differ by region', () => {
  it('are written in the dictionary, not in a screen', () => {
    const found = sourceFiles('components', 'app').flatMap(({ file, text }) =>
      asRead(text)
        .split('\n')
        .flatMap((line, index) =>
          regional.test(line) || caption.test(line) ? [`${file}:${index + 1} ${line.trim()}`] : [],
        ),
    );
    expect(found).toEqual([]);
  });

  it('would be found where somebody writes one', () => {
    for (const line of [
      "label: 'Toe kick'",
      '<p>the worktop</p>',
      "words: 'Outlet'",
      'title="Skirting boards"',
    ]) {
      expect(regional.test(asRead(line)) || caption.test(asRead(line))).toBe(true);
    }
    expect(regional.test(asRead("kind === 'worktop-template'"))).toBe(false);
  });
});
