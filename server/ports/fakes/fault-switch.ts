/** Faults that a test (or a curious visitor of the demo) asks a fake to have. */
export type FaultSwitch<Fault> = {
  /** From now on, for so many tries (for ever by default), to one address or to all. */
  set(fault: Fault, limits?: { times?: number; to?: string }): void;
  clear(): void;
  /** The fault that this try has, used up once. */
  take(to: string): Fault | null;
};

export function faultSwitch<Fault>(): FaultSwitch<Fault> {
  let waiting: { fault: Fault; left: number; to: string | null }[] = [];
  return {
    set(fault, { times = Number.POSITIVE_INFINITY, to } = {}) {
      waiting.push({ fault, left: times, to: to ?? null });
    },
    clear() {
      waiting = [];
    },
    take(to) {
      const found = waiting.find((entry) => entry.to === null || entry.to === to);
      if (!found) return null;
      found.left -= 1;
      waiting = waiting.filter((entry) => entry.left > 0);
      return found.fault;
    },
  };
}
