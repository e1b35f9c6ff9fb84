import { Refusal, type RefusalDetail } from './problem-response';

/** What the database refused, by the constraint's name; null when it was something else. */
export function refusedConstraint(error: unknown): string | null {
  for (let cause = error; cause instanceof Error; cause = cause.cause) {
    const { code, constraint } = cause as Error & { code?: string; constraint?: string };
    if (code?.startsWith('23') && constraint) return constraint;
  }
  return null;
}

/** Runs a write; a refusal by one of the named constraints becomes the words given for it. */
export async function translateRefusals<T>(
  words: Record<string, () => RefusalDetail | Promise<RefusalDetail>>,
  write: () => Promise<T>,
): Promise<T> {
  try {
    return await write();
  } catch (error) {
    const constraint = refusedConstraint(error);
    const detail = constraint ? words[constraint] : undefined;
    if (!detail) throw error;
    throw new Refusal(await detail());
  }
}
