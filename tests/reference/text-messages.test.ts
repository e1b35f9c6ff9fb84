import fc from 'fast-check';
import { SegmentedMessage } from 'sms-segments-calculator';
import { describe, expect, test } from 'vitest';
import { gsmBasic, gsmExtension, gsmSeptets } from '@/lib/messages/gsm-alphabet';
import { toE164 } from '@/lib/messages/phone-number';
import { understandReply } from '@/lib/messages/replies';
import { countSegments } from '@/lib/messages/segments';
import type { Region } from '@/lib/time/text-locale';
import { twilioSms } from '@/server/ports/sms/twilio-sms';
import data from './data/text-messages.json';

describe('the GSM alphabet of 3GPP TS 23.038', () => {
  test('has the published characters in the published order', () => {
    expect(gsmBasic).toBe(data.alphabet.basicByCode.replace('\u001b', ''));
    expect([...gsmExtension].toSorted()).toEqual(Object.keys(data.alphabet.extension).toSorted());
    expect(new Set(gsmBasic + gsmExtension).size).toBe(127 + 10);
  });

  test('agrees with an independent calculator on every character of the first planes', () => {
    const wrong: string[] = [];
    for (let code = 1; code < 0x3000; code++) {
      const character = String.fromCodePoint(code);
      const theirs = new SegmentedMessage(character, 'auto').encodingName === 'GSM-7';
      if (theirs !== (gsmSeptets(character) !== null)) wrong.push(`U+${code.toString(16)}`);
    }
    expect(wrong).toEqual([]);
  });
});

describe('segments', () => {
  test.each(data.segments.values)('$name takes $segments of $encoding', ({ text, ...expected }) => {
    const { encoding, segments } = countSegments(text);
    expect({ encoding, segments }).toEqual({
      encoding: expected.encoding,
      segments: expected.segments,
    });
  });

  test('agrees with an independent calculator on any text', () => {
    const letters = fc.constantFrom('a', 'é', '€', '[', '\n', ' ', 'Z');
    const dear = fc.constantFrom('a', 'ж', '’', '😀', '€', 'ç');
    const text = fc.oneof(
      fc.string({ unit: letters, maxLength: 700 }),
      fc.string({ unit: dear, maxLength: 400 }),
    );
    fc.assert(
      fc.property(text, (sample) => {
        fc.pre(sample !== '');
        const ours = countSegments(sample);
        const theirs = new SegmentedMessage(sample, 'auto');
        expect([ours.encoding, ours.segments]).toEqual([theirs.encodingName, theirs.segmentsCount]);
      }),
      { numRuns: 500 },
    );
  });
});

test.each(data.signatures.values)('the signature of a webhook: $signature', (example) => {
  const { token, url, params, signature } = example;
  const sms = twilioSms({
    accountSid: 'AC00000000000000000000000000000001',
    authToken: token,
    from: '',
  });
  expect(sms.isGenuine({ url, params, signature })).toBe(true);
  expect(sms.isGenuine({ url, params: { ...params, Digits: '1235' }, signature })).toBe(false);
});

describe('opt-out words', () => {
  test.each([...data.optOutWords.law, ...data.optOutWords.provider])('"%s" stops texts', (word) => {
    expect(understandReply(word).meaning).toBe('stop');
    expect(understandReply(` ${word.toUpperCase()}. `).meaning).toBe('stop');
  });
  test.each(data.optOutWords.optIn)('"%s" starts them again', (word) => {
    expect(understandReply(word).meaning).toBe('start');
  });
  test.each(data.optOutWords.help)('"%s" asks for help', (word) => {
    expect(understandReply(word).meaning).toBe('help');
  });
});

test.each(data.phoneNumbers.values)('$text in $region is $e164', ({ text, region, e164 }) => {
  expect(toE164(text, region as Region).value?.e164).toBe(e164);
});
