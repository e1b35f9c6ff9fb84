import { apiPaths } from '@/lib/paths';

/** Signs in through the door of a running program; gives the cookies as a browser would send them. */
export async function signInAt(
  baseUrl: string,
  person: { email: string; password: string },
): Promise<string> {
  const response = await fetch(baseUrl + apiPaths.signIn(), {
    method: 'POST',
    headers: { origin: baseUrl, 'content-type': 'application/json' },
    body: JSON.stringify(person),
  });
  if (!response.ok) throw new Error(`${person.email} did not get in: ${response.status}`);
  return cookiesOf(response);
}

export function cookiesOf(response: Response): string {
  return response.headers
    .getSetCookie()
    .map((text) => text.split(';')[0])
    .join('; ');
}
