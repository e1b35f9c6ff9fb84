/**
 * JSON with the keys of every object in order, so that two texts are equal when the values are, whichever
 * way the database or a phone wrote them down.
 *
 * Edge: a key that holds undefined is left out, as JSON does.
 * Example: `sortedJson({ b: 1, a: [2] })` is `{"a":[2],"b":1}`.
 */
export function sortedJson(value: unknown): string {
  return JSON.stringify(value, (_key, part: unknown) =>
    part !== null && typeof part === 'object' && !Array.isArray(part)
      ? Object.fromEntries(Object.entries(part).sort(([one], [other]) => (one < other ? -1 : 1)))
      : part,
  );
}
