import { logBug } from './log';

/** Does a round every so often, never two at once; gives what stops it after the round under way. */
export function repeat(
  name: string,
  everyMs: number,
  round: () => Promise<unknown>,
): () => Promise<void> {
  let underWay: Promise<unknown> | null = null;
  const timer = setInterval(() => {
    underWay ??= round()
      .catch((error) => logBug(name, error))
      .finally(() => {
        underWay = null;
      });
  }, everyMs);
  timer.unref();
  return async () => {
    clearInterval(timer);
    await underWay;
  };
}
