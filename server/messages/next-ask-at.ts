/** A report comes within seconds or not at all: the provider is asked for it less and less often, for a day. */
const askAfterMs = [10, 60, 6 * 60, 24 * 60].map((minutes) => minutes * 60_000);

/** When to ask next; null when a day has passed and asking is over. */
export function nextAskAt(sentAt: Date, now: Date): Date | null {
  const next = askAfterMs.find((ms) => sentAt.getTime() + ms > now.getTime());
  return next === undefined ? null : new Date(sentAt.getTime() + next);
}
