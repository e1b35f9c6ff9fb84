import type { CustomerAnswerInput } from '@/lib/contracts/visits';
import { paths } from '@/lib/paths';
import { Refusal } from '@/server/base/problem-response';
import { applyAnswer } from './apply-answer';
import { customerContext } from './customer-context';

/** One tap on the customer's page: yes, another time, or not ready. */
export async function answerVisit(input: CustomerAnswerInput, from: string): Promise<void> {
  const { token, ...answer } = input;
  const ctx = await customerContext(token, from);
  if (!ctx) throw noSuchLink();
  await ctx.db.transaction((tx) => applyAnswer(tx, ctx, answer));
}

/**
 * The answer of a plain form: back to the page, which says how the visit stands now. That is so when the
 * answer came too late as well, and a link that opens nothing leads to a page that is not there.
 */
export async function answerByForm(input: CustomerAnswerInput, from: string): Promise<Response> {
  try {
    await answerVisit(input, from);
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
  }
  const location = paths.customerVisit(input.token);
  return new Response(null, { status: 303, headers: { location } });
}

/** The same for a guess, a link that has ended and one that was revoked. */
export function noSuchLink(): Refusal {
  return new Refusal({
    status: 404,
    code: 'not-found',
    message: 'This link opens nothing any more. Ring the shop.',
  });
}
