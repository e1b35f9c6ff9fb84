import { describe, expect, test } from 'vitest';
import { type ConsentRecord, channelsFor, consentNow } from '@/lib/messages/consent';

const given: ConsentRecord = {
  channel: 'sms',
  given: true,
  at: new Date('2026-05-01'),
  sequence: 1,
};
const stopped: ConsentRecord = {
  channel: 'sms',
  given: false,
  at: new Date('2026-06-01'),
  sequence: 2,
};
const person = {
  consents: [given],
  phone: '+12025550123',
  phoneTakesTexts: true,
  email: 'rosa@tarn.example',
};

describe('consentNow', () => {
  test('is what was said last, in whatever order the records come', () => {
    expect(consentNow([], 'sms')).toBe('never-asked');
    expect(consentNow([given], 'sms')).toBe('given');
    expect(consentNow([stopped, given], 'sms')).toBe('withdrawn');
    const again = { ...given, at: new Date('2026-07-01'), sequence: 3 };
    expect(consentNow([stopped, again, given], 'sms')).toBe('given');
  });
  test('is told apart by sequence within one instant', () => {
    const at = given.at;
    expect(consentNow([{ ...stopped, at }, given], 'sms')).toBe('withdrawn');
  });
  test('holds for its own channel only', () => {
    expect(consentNow([stopped], 'email')).toBe('never-asked');
  });
});

describe('channelsFor', () => {
  test('tells by both ways who said yes to texts', () => {
    expect(channelsFor(person)).toEqual({
      channels: ['sms', 'email'],
      leftOut: [],
      callThem: false,
    });
  });
  test.each([
    [{ consents: [given, stopped] }, 'said no to texts'],
    [{ consents: [] }, 'not asked about texts'],
    [{ phone: '' }, 'no phone number'],
    [{ phoneTakesTexts: false }, 'this number takes no texts'],
  ])('falls to e-mail for %o', (changed, because) => {
    expect(channelsFor({ ...person, ...changed })).toEqual({
      channels: ['email'],
      leftOut: [{ channel: 'sms', because }],
      callThem: false,
    });
  });
  test('asks for a call when no way is left', () => {
    const noMail = { channel: 'email' as const, given: false, at: given.at, sequence: 9 };
    expect(channelsFor({ ...person, consents: [stopped, noMail] })).toMatchObject({
      channels: [],
      callThem: true,
    });
    expect(channelsFor({ ...person, phone: '', email: '' }).callThem).toBe(true);
  });
});
