import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { phoneWords, toE164 } from '@/lib/messages/phone-number';

describe('toE164', () => {
  test.each([
    '(202) 555-0123',
    '202.555.0123',
    '202 555 0123',
    '1 202 555 0123',
    '+1 (202) 555‑0123',
    '2025550123',
    ' 202-555-0123 ',
  ])('reads "%s"', (text) => {
    expect(toE164(text, 'US')).toEqual({
      value: {
        e164: '+12025550123',
        national: '(202) 555-0123',
        international: '+1 202 555 0123',
        takesTexts: 'yes',
      },
      problems: [],
    });
  });

  test.each([
    '',
    '12',
    '555-0123',
    'call me',
    '1-800-FLOWERS',
    '202 555 0123 or 202 555 0124',
    'rosa@tarn.example',
  ])('refuses "%s"', (text) => {
    expect(toE164(text, 'US')).toMatchObject({
      value: null,
      problems: [{ code: 'phone-not-readable', severity: 'error' }],
    });
  });

  test('refuses an extension, which cannot be texted', () => {
    for (const text of ['202-555-0123 x5', '(202) 555-0123 ext. 5']) {
      expect(toE164(text, 'US').problems[0]?.code).toBe('phone-with-extension');
    }
  });

  test('takes a number kept for drama, with a warning that no country has given it out', () => {
    const { value, problems } = toE164('07700 900123', 'UK');
    expect(value).toMatchObject({ e164: '+447700900123', takesTexts: 'unknown' });
    expect(problems).toMatchObject([{ code: 'phone-not-in-use', severity: 'warning' }]);
  });

  test('knows a landline that takes no texts', () => {
    expect(toE164('020 7946 0123', 'UK').value?.takesTexts).toBe('no');
  });

  test('needs a country code where the region is no country', () => {
    expect(toE164('600 000 000', 'EU').problems[0]?.message).toContain('country code');
    expect(toE164('+61 491 570 156', 'EU').value?.e164).toBe('+61491570156');
  });

  test('reads its own answer again as the same', () => {
    const digits = fc.integer({ min: 100, max: 199 }).map((last) => `(202) 555-0${last}`);
    fc.assert(
      fc.property(digits, (text) => {
        const { value } = toE164(text, 'US');
        if (!value) throw new Error(text);
        expect(value.e164).toMatch(/^\+[1-9]\d{6,14}$/);
        for (const again of [value.e164, value.national, value.international]) {
          expect(toE164(again, 'US').value?.e164).toBe(value.e164);
        }
      }),
    );
  });

  test('never throws, whatever is typed', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'grapheme', maxLength: 300 }), (text) => {
        const { value, problems } = toE164(text, 'US');
        expect(value !== null || problems.length > 0).toBe(true);
      }),
    );
  });
});

describe('phoneWords', () => {
  test.each([
    ['+12025550123', 'US', '(202) 555-0123'],
    ['+447700900123', 'UK', '07700 900123'],
    ['+12025550123', 'UK', '+1 202 555 0123'],
    ['+12025550123', 'EU', '+1 202 555 0123'],
    ['', 'US', ''],
    ['not a number', 'US', 'not a number'],
  ] as const)('writes %s in the %s as %s', (kept, region, words) => {
    expect(phoneWords(kept, region)).toBe(words);
  });
});
