import { describe, expect, it } from 'vitest';
import { env } from '@/server/base/env';

const set = (settings: Record<string, string>) => env({ NODE_ENV: 'production', ...settings });
const sms = { SMS_ACCOUNT_SID: 'AC1', SMS_AUTH_TOKEN: 'secret', SMS_FROM: '+12025550100' };

describe('the settings of the machine', () => {
  it('are none at first: an embedded database, and nobody who carries texts or e-mail', () => {
    expect(set({})).toMatchObject({ databaseUrl: null, sms: null, smtpUrl: null, demo: false });
  });

  it('count as not set when they are empty', () => {
    expect(set({ SMTP_URL: '', DATABASE_URL: '', TRAVEL_URL: '' })).toEqual(set({}));
  });

  it('name a text service whole or not at all', () => {
    expect(set(sms).sms).toEqual({ accountSid: 'AC1', authToken: 'secret', from: '+12025550100' });
    const half = { ...sms, SMS_FROM: '' };
    expect(() => set(half)).toThrow(/SMS_FROM: is missing: texts need SMS_ACCOUNT_SID/);
  });

  it('say whom e-mail is from before any goes out', () => {
    const SMTP_URL = 'smtps://mail.example';
    expect(() => set({ SMTP_URL })).toThrow(/EMAIL_FROM: is missing/);
    expect(set({ SMTP_URL, EMAIL_FROM: 'a@b.example' })).toMatchObject({
      emailFrom: 'a@b.example',
    });
  });

  it('are told one by one when they cannot be used, without their values', () => {
    const wrong = { PUBLIC_URL: 'my shop', BETTER_AUTH_SECRET: 'short', TILES_URL: 'x/{z}' };
    expect(() => set(wrong)).toThrow(/PUBLIC_URL: [\s\S]*BETTER_AUTH_SECRET: [\s\S]*TILES_URL: /);
    expect(() => set(wrong)).not.toThrow(/my shop/);
  });
});
