const LETTERS = 26;
const FIRST = 'A'.charCodeAt(0);

/**
 * The letter of the revision after this one; of the first when there is none.
 *
 * Edge: after Z comes AA, after AZ comes BA, after ZZ comes AAA.
 * Example: null gives A, C gives D, Z gives AA.
 * Problems: none. Source: common practice on drawings (letters kept whole: I and O are used).
 */
export function nextRevision(newest: string | null): string {
  if (newest === null) return 'A';
  const codes = [...newest].map((letter) => letter.charCodeAt(0) - FIRST);
  for (let place = codes.length - 1; place >= 0; place -= 1) {
    const raised = (codes[place] ?? 0) + 1;
    codes[place] = raised % LETTERS;
    if (raised < LETTERS) return inLetters(codes);
  }
  return inLetters([0, ...codes]);
}

/** Which of two revisions is newer: sorts A … Z before AA. */
export function compareRevisions(one: string, other: string): number {
  return one.length - other.length || (one < other ? -1 : one > other ? 1 : 0);
}

function inLetters(codes: number[]): string {
  return codes.map((code) => String.fromCharCode(FIRST + code)).join('');
}
