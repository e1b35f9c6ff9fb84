import type { CustomerContext } from '@/server/base/context';
import { Refusal } from '@/server/base/problem-response';
import { customerContext } from './customer-context';

/** Who holds a link; past the limit of tries the answer is that of any link that opens nothing: null. */
export async function openLink(token: string, from: string): Promise<CustomerContext | null> {
  try {
    return await customerContext(token, from);
  } catch (error) {
    if (error instanceof Refusal) return null;
    throw error;
  }
}
