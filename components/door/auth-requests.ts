import { askServer, RequestProblem } from '@/components/shell/ask-server';
import type { CreateShopInput, JoinShopInput } from '@/lib/contracts/people';
import { apiPaths } from '@/lib/paths';
import { forgetOnPhone } from './forget-on-phone';

/**
 * Every request of the door. The answers carry the session's cookie; nothing in them is read. Whoever
 * comes or goes, this device then keeps nothing of what the office showed the one before.
 */

export async function signIn(input: { email: string; password: string }): Promise<void> {
  try {
    await askServer(apiPaths.signIn(), { body: input });
  } catch (caught) {
    throw signInProblem(caught);
  }
  await forgetOnPhone();
}

export async function signUpShop(input: CreateShopInput): Promise<void> {
  await askServer(apiPaths.shops(), { body: input });
  await forgetOnPhone();
}

export async function joinShop(input: JoinShopInput): Promise<void> {
  await askServer(apiPaths.joinShop(), { body: input });
  await forgetOnPhone();
}

export async function signOut(): Promise<void> {
  await askServer(apiPaths.signOut(), { body: {} });
  await forgetOnPhone();
}

export async function switchShop(shopId: string): Promise<void> {
  await askServer(apiPaths.switchShop(), { body: { shopId } });
  await forgetOnPhone();
}

/** The sign-in library says only a status; which of the two was wrong is nobody's business. */
function signInProblem(caught: unknown): unknown {
  if (!(caught instanceof RequestProblem)) return caught;
  const { status } = caught.problem;
  const says = (title: string, detail: string) =>
    new RequestProblem({ type: 'urn:setwell:problem:sign-in', title, status, detail });
  if (status === 400 || status === 401 || status === 403) {
    return says('This e-mail and password do not go together.', 'Check both and try again.');
  }
  if (status === 429) {
    return says('Too many tries in a short time.', 'Wait a minute, then try again.');
  }
  return caught;
}
