/** Problems are values in `lib`: a code to act on, words to read, and what they point at. */
export type Problem = {
  /** Stable, kebab-case: "diagonal-too-long". */
  code: string;
  /** What happened and what to do, in the trade's words. */
  message: string;
  /** Ids of the readings (or walls, runs, units) it speaks of. */
  about: string[];
  /** error: no value can be given; warning: the value stands, with care. */
  severity: 'error' | 'warning';
};

/** A value with the problems found on the way; the value is null when an error forbids one. */
export type Outcome<T> = { value: T | null; problems: Problem[] };

export function problem(code: string, message: string, about: string[] = []): Problem {
  return { code, message, about, severity: 'error' };
}

export function warning(code: string, message: string, about: string[] = []): Problem {
  return { code, message, about, severity: 'warning' };
}

/** No value, for this one reason; assignable to any `Outcome`. */
export function refused(...problems: Problem[]): { value: null; problems: Problem[] } {
  return { value: null, problems };
}
