import { logBug } from './log';

export type Repeated = {
  /** Something is to be done: a round at once, or right after the one under way. */
  kick: () => void;
  /** Stops it after the round under way. */
  stop: () => Promise<void>;
};

/** Does a round every so often and when kicked, never two at once. */
export function repeat(name: string, everyMs: number, round: () => Promise<unknown>): Repeated {
  let isStopped = false;
  let isKicked = false;
  let underWay: Promise<void> | null = null;

  function run(): void {
    if (isStopped || underWay) return;
    isKicked = false;
    underWay = round()
      .catch((error) => logBug(name, error))
      .then(() => {
        underWay = null;
        if (isKicked) run();
      });
  }

  const timer = setInterval(run, everyMs);
  timer.unref();
  return {
    kick() {
      isKicked = true;
      run();
    },
    async stop() {
      isStopped = true;
      clearInterval(timer);
      await underWay;
    },
  };
}
