/** Structured lines without personal data: ids and counts, never names, numbers or texts. */
export type Log = (
  event: string,
  detail?: Record<string, string | number | boolean | null>,
) => void;

export const log: Log = (event, detail = {}) => {
  process.stdout.write(`${JSON.stringify({ at: new Date().toISOString(), event, ...detail })}\n`);
};

/** For bugs: the cause goes to the log, "Something went wrong" goes outside. */
export function logBug(where: string, error: unknown): void {
  const text = error instanceof Error ? (error.stack ?? error.message) : String(error);
  const cause = error instanceof Error && error.cause ? String(error.cause) : null;
  process.stderr.write(
    `${JSON.stringify({ at: new Date().toISOString(), event: 'bug', where, text, cause })}\n`,
  );
}
