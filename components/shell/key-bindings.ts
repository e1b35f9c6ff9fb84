/** What one key, or one key after another, does on this page. */
export type KeyBinding = {
  /** "n", "g d", "ArrowLeft", "?": names as the browser gives them, letters small. */
  keys: string;
  /** What it does, as the list of keys says it. */
  words: string;
  run: () => void;
};

const signs: Record<string, string> = {
  ArrowLeft: '←',
  ArrowRight: '→',
  ArrowUp: '↑',
  ArrowDown: '↓',
  Escape: 'Esc',
};

/** As printed on the keyboard: "g d" is "G D". */
export function keySigns(keys: string): string {
  return keys
    .split(' ')
    .map((key) => signs[key] ?? key.toUpperCase())
    .join(' ');
}

export type KeyStep = { binding: KeyBinding | null; pressed: string };

/**
 * One key more. A whole binding is returned and the slate wiped; the start of one is kept; anything
 * else starts again with this key. Later bindings win: a page may take a key from the shell.
 * Example: after "g", "d" finds the binding "g d"; after "x", "d" finds the binding "d".
 */
export function stepKeys(
  bindings: readonly KeyBinding[],
  pressedBefore: string,
  key: string,
): KeyStep {
  const name = key.length === 1 ? key.toLowerCase() : key;
  const together = pressedBefore ? `${pressedBefore} ${name}` : name;
  for (const pressed of together === name ? [name] : [together, name]) {
    const binding = bindings.findLast((candidate) => candidate.keys === pressed);
    if (binding) return { binding, pressed: '' };
    if (bindings.some((candidate) => candidate.keys.startsWith(`${pressed} `))) {
      return { binding: null, pressed };
    }
  }
  return { binding: null, pressed: '' };
}
