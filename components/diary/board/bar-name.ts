/**
 * A customer's name in two parts, at the first space: where a bar is narrow the second alone is shown, in full.
 * Examples: "Odile Pryce" is "Odile" and "Pryce"; "Maria del Carmen" is "Maria" and "del Carmen"; one word is
 * all of the second.
 */
export function barName(name: string): { first: string; last: string } {
  const at = name.trim().indexOf(' ');
  if (at < 0) return { first: '', last: name.trim() };
  return { first: name.trim().slice(0, at), last: name.trim().slice(at + 1) };
}
