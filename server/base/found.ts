import { notFound } from 'next/navigation';
import { Refusal } from './problem-response';

/** For pages: what is not there, or not yours, or no id at all, is the framework's 404. */
export async function found<T>(reading: Promise<T>): Promise<T> {
  try {
    return await reading;
  } catch (error) {
    if (error instanceof Refusal && error.refusal.status === 404) notFound();
    if (isNoId(error)) notFound();
    throw error;
  }
}

/** The database could not read a piece of the address as an id: 22P02, invalid text representation. */
function isNoId(error: unknown): boolean {
  const cause = error instanceof Error ? error.cause : null;
  return cause instanceof Error && 'code' in cause && cause.code === '22P02';
}
