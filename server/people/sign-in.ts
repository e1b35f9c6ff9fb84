import { auth } from '@/server/base/auth';

/** The sign-in library's own hash, so that a password set here opens the door there. */
export async function hashPassword(password: string): Promise<string> {
  return (await (await auth()).$context).password.hash(password);
}

export async function passwordOpens(email: string, password: string): Promise<boolean> {
  const { internalAdapter, password: passwords } = await (await auth()).$context;
  const found = await internalAdapter.findUserByEmail(email, { includeAccounts: true });
  const hash = found?.accounts.find(({ providerId }) => providerId === 'credential')?.password;
  return hash ? passwords.verify({ hash, password }) : false;
}

/** An answer that carries the session's cookie. */
export async function signedInResponse(
  email: string,
  password: string,
  headers: Headers,
): Promise<Response> {
  return (await auth()).api.signInEmail({ body: { email, password }, headers, asResponse: true });
}
