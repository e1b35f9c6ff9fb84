import { Refusal, type RefusalDetail } from '@/server/base/problem-response';

/** What a verb refused with; fails the test when it did not, or failed otherwise. */
export async function refusalOf(work: Promise<unknown>): Promise<RefusalDetail> {
  try {
    await work;
  } catch (error) {
    if (error instanceof Refusal) return error.refusal;
    throw error;
  }
  throw new Error('it was not refused');
}
