import { beforeAll, describe, expect, it } from 'vitest';
import { POST as askDoor, GET as readDoor } from '@/app/api/auth/[...all]/route';
import { GET as listPeopleRoute } from '@/app/api/people/route';
import { apiPaths } from '@/lib/paths';
import { callRoute } from '../help/call-route';
import { cookieOf, makeShop, type TestPerson, type TestShop } from '../help/make-shop';
import { cookiesOf } from '../help/sign-in-at';

const ours = 'http://localhost:3000';

describe('the door', () => {
  let shop: TestShop;
  let measurer: TestPerson;
  beforeAll(async () => {
    shop = await makeShop();
    measurer = shop.people.measurer;
  });

  const post = (address: string, body: unknown, headers: Record<string, string> = {}) =>
    askDoor(
      new Request(ours + address, {
        method: 'POST',
        headers: { origin: ours, 'content-type': 'application/json', ...headers },
        body: JSON.stringify(body),
      }),
    );
  const signIn = (password: string, headers?: Record<string, string>) =>
    post(apiPaths.signIn(), { email: measurer.email, password }, headers);
  const peopleAsSeenBy = (cookie: string) => callRoute(listPeopleRoute, { method: 'GET', cookie });

  it('opens to the right password, and the cookie is not for scripts', async () => {
    const answer = await signIn('test-password');
    expect(answer.status).toBe(200);
    expect(answer.headers.getSetCookie().join('\n')).toMatch(/setwell\..*HttpOnly/i);
    expect((await peopleAsSeenBy(cookiesOf(answer))).status).toBe(200);
  });

  it('stays shut to a wrong password, in the same words as to an unknown e-mail', async () => {
    const wrong = await signIn('not-the-password');
    const unknown = await post(apiPaths.signIn(), {
      email: 'nobody@shop.example',
      password: 'not-the-password',
    });
    expect(wrong.status).toBe(401);
    expect(wrong.headers.getSetCookie()).toEqual([]);
    expect([unknown.status, await unknown.json()]).toEqual([wrong.status, await wrong.json()]);
  });

  it('hears no page of another site that holds the cookie', async () => {
    const cookie = await cookieOf(measurer);
    const answer = await post(apiPaths.signOut(), {}, { cookie, origin: 'https://evil.example' });
    expect(answer.status).toBe(403);
    expect((await peopleAsSeenBy(cookie)).status).toBe(200);
  });

  it('is shut behind whoever signs out, also to a kept copy of the cookie', async () => {
    const cookie = await cookieOf(measurer);
    expect((await post(apiPaths.signOut(), {}, { cookie })).status).toBe(200);
    expect((await peopleAsSeenBy(cookie)).status).toBe(401);
  });

  it('makes no account and changes none: shops and invitations do', async () => {
    const cookie = await cookieOf(measurer);
    const bodies: [string, unknown][] = [
      ['/sign-up/email', { email: 'new@shop.example', password: 'a-long-password', name: 'New' }],
      ['/update-user', { name: 'Somebody Else' }],
      ['/change-email', { newEmail: 'else@shop.example' }],
      ['/delete-user', { password: 'test-password' }],
    ];
    for (const [path, body] of bodies) {
      const answer = await post(`/api/auth${path}`, body, { cookie });
      expect([path, answer.ok]).toEqual([path, false]);
    }
    expect((await signIn('test-password')).status).toBe(200);
  });

  it('names nobody to a stranger who asks whose session this is', async () => {
    const answer = await readDoor(new Request(`${ours}/api/auth/get-session`));
    expect(await answer.json()).toBe(null);
  });
});
