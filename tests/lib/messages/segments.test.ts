import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { gsmSeptets } from '@/lib/messages/gsm-alphabet';
import { plainSms } from '@/lib/messages/plain-sms';
import { countSegments } from '@/lib/messages/segments';

describe('culprits', () => {
  test('are named once each, with the place of the first', () => {
    const { culprits, encoding } = countSegments('We’re here — we’re\tdone 😀!');
    expect(encoding).toBe('UCS-2');
    expect(culprits).toEqual([
      { character: '’', code: 'U+2019', at: 2 },
      { character: '—', code: 'U+2014', at: 11 },
      { character: '\t', code: 'U+0009', at: 18 },
      { character: '😀', code: 'U+1F600', at: 24 },
    ]);
  });

  test('are none in a plain text', () => {
    expect(countSegments("It's 8:00 AM @ 5 € - ¿qué?").culprits).toEqual([]);
  });
});

test('an empty text takes no message', () => {
  expect(countSegments('')).toEqual({ encoding: 'GSM-7', segments: 0, units: 0, culprits: [] });
});

test('a character of two units is not cut in two at the end of a message', () => {
  expect(countSegments(`${'a'.repeat(152)}€${'a'.repeat(151)}`).segments).toBe(2);
  expect(countSegments(`${'a'.repeat(152)}€${'a'.repeat(152)}`).segments).toBe(3);
  expect(countSegments(`${'ж'.repeat(66)}😀${'ж'.repeat(65)}`).segments).toBe(2);
  expect(countSegments(`${'ж'.repeat(66)}😀${'ж'.repeat(66)}`).segments).toBe(3);
});

describe('plainSms', () => {
  test.each([
    ['José’s sábado — ¿así?', "José's sabado - ¿asi?"],
    ['Instalación el miércoles', 'Instalacion el miércoles'],
    ['“Yes”… 34½ × 12', '"Yes"... 341/2 x 12'],
    ['a\u00a0b\tc\u200bd', 'a b cd'],
    ['cafe\u0301', 'café'],
    ['Ça va, garçon', 'Ça va, garcon'],
    ['Łódź 😀 ж', 'Łodz 😀 ж'],
  ])('"%s" is sent as "%s"', (text, sent) => {
    expect(plainSms(text)).toBe(sent);
  });

  test('changes nothing in a text that SMS carries', () => {
    const letter = fc.constantFrom(
      ...'@£$ñéèùìòÇ\nØøÅåΔ_ !"#%&\'()*+,-./09:;<=>?¡AZÄÖÑÜ§¿azäöñüà€[]{}~|^\\',
    );
    fc.assert(
      fc.property(fc.string({ unit: letter }), (text) => {
        expect(plainSms(text)).toBe(text);
      }),
    );
  });

  test('never makes a text dearer, and twice is as once', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary', maxLength: 200 }), (text) => {
        const plain = plainSms(text);
        expect(plainSms(plain)).toBe(plain);
        const dear = (sample: string) =>
          [...sample].filter((one) => gsmSeptets(one) === null).length;
        expect(dear(plain)).toBeLessThanOrEqual(dear(text.normalize('NFC')));
      }),
      { numRuns: 50 },
    );
  });
});
