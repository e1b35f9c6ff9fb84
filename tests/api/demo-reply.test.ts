import { afterEach, describe, expect, it, vi } from 'vitest';
import { POST as replyRoute } from '@/app/(demo)/demo/phone/reply/route';
import { paths } from '@/lib/paths';
import { getPorts } from '@/server/ports/choose-ports';
import { callRoute } from '../help/call-route';

describe('texting back as a customer of the demo', () => {
  afterEach(() => vi.unstubAllEnvs());
  const reply = (body: { number: string; body: string }) =>
    callRoute(replyRoute, { url: paths.demoReply(), body });
  const number = '+12125550199';

  it('is not there in a shop that works', async () => {
    expect((await reply({ number, body: 'YES' })).status).toBe(404);
    expect((await getPorts()).fakes.sms?.messagesFor(number)).toEqual([]);
  });

  it('refuses what is no number and an empty text, and sends nothing', async () => {
    vi.stubEnv('SETWELL_DEMO', '1');
    const answer = await reply({ number: 'javascript:alert(1)', body: ' ' });
    expect(answer.status).toBe(422);
    expect(answer.body).toMatchObject({
      errors: { number: expect.any(String), body: 'Write something.' },
    });
  });
});
