import { describe, expect, test } from 'vitest';
import { checkTemplate, type TemplateUse } from '@/lib/messages/check-template';
import { fieldsOf, fieldWords, isTextAnswer, occasions } from '@/lib/messages/occasions';
import { plainSms } from '@/lib/messages/plain-sms';
import { renderEmail, renderSms, usualWording } from '@/lib/messages/render-message';
import { understandReply } from '@/lib/messages/replies';
import { sampleValues } from '@/lib/messages/sample-values';
import { countSegments } from '@/lib/messages/segments';
import { readTemplate, renderTemplate, wordingParts } from '@/lib/messages/template';
import { visitInWords } from '@/lib/messages/visit-words';
import { visitKinds } from '@/lib/schedule';
import { languages } from '@/lib/time/text-locale';

const sms: TemplateUse = { occasion: 'booked', part: 'sms', language: 'en' };
const codes = (template: string, use = sms) => checkTemplate(template, use).map(({ code }) => code);

describe('filling', () => {
  test('puts values where fields stand', () => {
    const values = { shop: 'Juniper Bend', day: 'Tue, May 12' };
    expect(renderTemplate('{shop}: we come {day}. {day}!', values)).toEqual({
      value: 'Juniper Bend: we come Tue, May 12. Tue, May 12!',
      problems: [],
    });
  });
  test('gives no text rather than one with a hole', () => {
    expect(renderTemplate('{shop} {day} {date} {', { shop: 'Juniper Bend' })).toMatchObject({
      value: null,
      problems: [
        { code: 'template-brace' },
        { code: 'field-without-value', about: ['day'] },
        { code: 'field-unknown', about: ['date'] },
      ],
    });
  });
  test('takes braces in a value as they are', () => {
    expect(renderTemplate('{shop}', { shop: '{day} {' }).value).toBe('{day} {');
  });
  test('knows no field by a name that every object has', () => {
    expect(renderTemplate('{constructor}', {}).problems[0]?.code).toBe('field-unknown');
  });
  test('ends a sentence with one full stop, though a value brings its own', () => {
    const values = { window: 'a la 1:00 p.m.', reason: 'Wait ...' };
    expect(renderTemplate('Llegamos {window}. {reason}', values).value).toBe(
      'Llegamos a la 1:00 p.m. Wait ...',
    );
  });
  test('leaves no space or gap behind an empty value', () => {
    const template = 'It is called off. {reason}\n\n{reason}\n\nBye';
    expect(renderTemplate(template, { reason: '' }).value).toBe('It is called off.\n\nBye');
  });
});

describe('checking', () => {
  test('passes a plain text with known fields', () => {
    expect(codes('{shop}: your {visit} is on {day}. {link}')).toEqual([]);
  });
  test.each([
    ['  ', ['template-empty']],
    ['{shop}: see you {date}', ['field-unknown']],
    ['{shop}: moved from {oldDay}', ['field-not-here']],
    ['{shop}: see you {day', ['template-brace']],
    ['{shop}: we’re coming', ['sms-character']],
    ['See you {day}', ['sms-without-shop']],
    [`{shop} ${'a'.repeat(300)}`, ['sms-too-long']],
  ])('"%s" has %o', (template, expected) => expect(codes(template)).toEqual(expected));

  test('names the character that makes a text dear, and what is sent instead', () => {
    const [first, second] = checkTemplate('{shop}: it’s here 😀', sms);
    expect(first).toMatchObject({ about: ['’'], severity: 'warning' });
    expect(first?.message).toContain(`is sent as "'"`);
    expect(second?.message).toContain('U+1F600');
    expect(second?.message).toContain('70 characters');
  });

  test.each([
    '{shop}: reply STOP to end these',
    '{shop}: text cancel to call it off',
    '{shop}: answer with the word quit',
    '{shop}: responda CANCELAR',
    '{shop}: envie la palabra baja',
    '{shop}: CANCEL if it does not suit',
  ])('"%s" asks for an opt-out', (template) =>
    expect(codes(template)).toContain('asks-for-opt-out'),
  );

  test.each([
    '{shop}: we stop by on {day}',
    '{shop}: the visit is cancelled',
    '{shop}: at the end of {day}',
  ])('"%s" does not', (template) => expect(codes(template)).not.toContain('asks-for-opt-out'));

  test('a subject is one line, and a text of an e-mail may hold any letter', () => {
    expect(codes('Hello\nBcc: all', { ...sms, part: 'subject' })).toEqual(['line-break']);
    expect(codes('Instalación — “{day}”', { ...sms, part: 'email' })).toEqual([]);
  });
});

const all = languages.flatMap((language) => occasions.map((occasion) => ({ language, occasion })));

describe('what a new shop says', () => {
  test.each(all)('$occasion in $language passes its own check', ({ language, occasion }) => {
    const wording = usualWording(occasion, language);
    const parts = isTextAnswer(occasion) ? (['sms'] as const) : wordingParts;
    for (const part of parts) {
      expect(checkTemplate(wording[part], { occasion, part, language }), part).toEqual([]);
    }
  });

  test.each(all)(
    '$occasion in $language goes out in two cheap messages at most',
    ({ language, occasion }) => {
      const values = sampleValues[language];
      const text = renderSms({ occasion, language, values }).value ?? '';
      const { encoding, segments } = countSegments(text);
      expect({ encoding, isShort: segments <= 2 }, text).toEqual({
        encoding: 'GSM-7',
        isShort: true,
      });
      expect(text).not.toMatch(/[{}]/);
    },
  );

  test.each(all)(
    '$occasion in $language needs only what the occasion has',
    ({ language, occasion }) => {
      const values = Object.fromEntries(fieldsOf[occasion].map((field) => [field, 'x']));
      expect(renderSms({ occasion, language, values }).problems).toEqual([]);
      expect(renderEmail({ occasion, language, values }).problems).toEqual([]);
      const hasEmail = renderEmail({ occasion, language, values }).value?.text !== '';
      expect(hasEmail).toBe(!isTextAnswer(occasion));
    },
  );

  test('the words that a customer is asked to answer with are understood', () => {
    for (const language of languages) {
      const { sms: text } = usualWording('please-confirm', language);
      const asked = text.match(/\b(YES|SI|CHANGE|CAMBIO)\b/g) ?? [];
      expect(asked.map((word) => understandReply(word).meaning)).toEqual(['yes', 'change']);
    }
  });

  test('both languages name the same fields in each e-mail', () => {
    const fieldsIn = (template: string) =>
      new Set(
        readTemplate(template).parts.flatMap((part) => ('field' in part ? [part.field] : [])),
      );
    for (const occasion of occasions) {
      const [en, es] = [usualWording(occasion, 'en'), usualWording(occasion, 'es')];
      expect(fieldsIn(es.email), occasion).toEqual(fieldsIn(en.email));
      expect(fieldsIn(es.sms), occasion).toEqual(fieldsIn(en.sms));
    }
  });
});

describe('rendering', () => {
  const values = {
    ...sampleValues.en,
    customer: '<script>alert(1)</script>',
    day: 'Tue\r\nBcc: eve@elsewhere.example',
  };

  test('a text is written with the letters that SMS carries', () => {
    const spanish = renderSms({
      occasion: 'booked',
      language: 'es',
      values: sampleValues.es,
    }).value;
    expect(spanish).toContain('instalacion de gabinetes queda para el miércoles');
    expect(spanish).toBe(plainSms(spanish ?? ''));
  });

  test.each(all)(
    '$occasion in $language is whole for a shop without a phone',
    ({ language, occasion }) => {
      const input = { occasion, language, values: { ...sampleValues[language], shopPhone: '' } };
      const texts = [renderSms(input).value ?? '', renderEmail(input).value?.text ?? ''];
      for (const text of texts) {
        expect(text).not.toMatch(/\s[.,]|\b(ring|at|Questions|Preguntas|Llame al|es)[:\s]*$/m);
      }
      const saysLink = usualWording(occasion, language).sms.includes('{link}');
      expect(texts[0]?.includes(sampleValues[language].link)).toBe(
        saysLink || occasion === 'moved-together',
      );
    },
  );

  test('the HTML escapes whatever a value holds', () => {
    const html = renderEmail({ occasion: 'booked', language: 'en', values }).value?.html ?? '';
    expect(html).toContain('Hello &lt;script&gt;alert(1)&lt;/script&gt;,');
    expect(html).not.toContain('<script>');
    const quoted = renderEmail({
      occasion: 'booked',
      language: 'en',
      values: { ...values, link: 'https://x.example/"onmouseover="alert(1)' },
    }).value?.html;
    expect(quoted).not.toContain('"onmouseover');
  });

  test('the link is a button, and is shown in full', () => {
    const html = renderEmail({ occasion: 'booked', language: 'en', values }).value?.html ?? '';
    const { link } = sampleValues.en;
    expect(html).toContain(`<a href="${link}"`);
    expect(html).toContain(`>${link}</span>`);
    expect(renderEmail({ occasion: 'booked', language: 'es', values }).value?.html).toContain(
      'lang="es"',
    );
  });

  test('a link of another kind than the web stays text', () => {
    const odd = { ...values, link: 'javascript:alert(1)' };
    const html = renderEmail({ occasion: 'booked', language: 'en', values: odd }).value?.html;
    expect(html).not.toContain('href');
  });

  test('a value with a line end makes no second line in a subject', () => {
    const subject = renderEmail({ occasion: 'booked', language: 'en', values }).value?.subject;
    expect(subject).toBe(
      `Your countertop template with ${values.shop}: Tue Bcc: eve@elsewhere.example`,
    );
  });

  test("the shop's own wording takes the place of ours, part by part", () => {
    const ownWording = { sms: '{shop} on {day}' };
    const input = { occasion: 'booked' as const, language: 'en' as const, values, ownWording };
    expect(renderSms(input).value).toBe(`${values.shop} on Tue Bcc: eve@elsewhere.example`);
    expect(renderEmail(input).value?.text).toContain('is booked for');
  });
});

test('a visit is named as the region names it', () => {
  expect(visitInWords('worktop-template', { language: 'en', region: 'US' })).toBe(
    'countertop template',
  );
  expect(visitInWords('worktop-template', { language: 'en', region: 'UK' })).toBe(
    'worktop template',
  );
  expect(visitInWords('worktop-template', { language: 'en', region: 'AU' })).toBe(
    'benchtop template',
  );
  expect(visitInWords('worktop-template', { language: 'es', region: 'US' })).toBe(
    'plantilla de la cubierta',
  );
  for (const kind of visitKinds)
    expect(visitInWords(kind, { language: 'es', region: 'EU' })).not.toBe('');
});

test('every field that an occasion has is explained', () => {
  for (const occasion of occasions) {
    for (const field of fieldsOf[occasion]) expect(fieldWords[field]).toBeTruthy();
  }
});
