import { notFound } from 'next/navigation';
import { Refusal } from './problem-response';

/** For pages: what is not there, or not yours, is the framework's 404. */
export async function found<T>(reading: Promise<T>): Promise<T> {
  try {
    return await reading;
  } catch (error) {
    if (error instanceof Refusal && error.refusal.status === 404) notFound();
    throw error;
  }
}
