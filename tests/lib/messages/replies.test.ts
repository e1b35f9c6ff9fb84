import fc from 'fast-check';
import { describe, expect, test } from 'vitest';
import { understandReply } from '@/lib/messages/replies';

const meaningOf = (text: string) => understandReply(text).meaning;

describe('yes', () => {
  test.each([
    'YES',
    'yes.',
    ' Y ',
    'C',
    'Sí',
    'SI',
    'sí, gracias!',
    'Yes, thank you!',
    'Yes please',
    'ok 👍',
    '👍🏽',
    'Confirmed',
    'That works, thanks',
    'Hola, sí, muchas gracias',
    'Si por favor',
    'Confirmo',
    'Yes yes',
    'See you then',
  ])('"%s" confirms', (text) => expect(meaningOf(text)).toBe('yes'));

  test.each([
    'Yes but can we do it later?',
    'Yes, at 9',
    'yes no',
    'si puedo el martes',
    'Is the floor ok?',
    'Thanks',
    'Gracias',
    'Yesterday',
    'ok cancel',
    '',
    '   ',
    '👎',
    'Who is this?',
    'No problem',
  ])('"%s" does not', (text) => expect(meaningOf(text)).not.toBe('yes'));
});

describe('another time', () => {
  test.each([
    ['no', 'no'],
    ['No thanks', 'no'],
    ['CHANGE', 'change'],
    ['CAMBIO', 'change'],
    ['Can we do another day?', 'change'],
    ["I can't make it", 'change'],
    ['¿Puede ser otro día?', 'change'],
    ['Necesito cambiar la hora por favor', 'change'],
    ['I won’t be home', 'change'],
  ])('"%s" is %s', (text, meaning) => expect(meaningOf(text)).toBe(meaning));
});

describe('stop', () => {
  test.each([
    'STOP',
    'Stop.',
    'unsubscribe',
    'Opt-out',
    'opt out',
    'ALTO',
    'Please stop texting me',
    'Do not text this number',
    "Don't text me any more",
    'Remove me from your list',
    'No más mensajes',
    'Dejen de mandarme mensajes',
    'Wrong number',
  ])('"%s" ends texts', (text) => expect(meaningOf(text)).toBe('stop'));

  test.each([
    'Please stop by at 9',
    'The bus stop is near the end of the road',
    'I will be there until the end',
  ])('"%s" does not', (text) => expect(meaningOf(text)).toBe('unclear'));

  test('CANCEL opts out, and is shown as perhaps meaning the visit', () => {
    expect(understandReply('CANCEL')).toEqual({ meaning: 'stop', mayCallOffVisit: true });
    expect(understandReply('Cancelar')).toEqual({ meaning: 'stop', mayCallOffVisit: true });
    expect(understandReply('STOP')).toEqual({ meaning: 'stop', mayCallOffVisit: false });
  });

  test.each([
    'Please cancel my appointment',
    'I need to cancel',
    'quiero cancelar la visita',
    'Yes, cancel',
  ])('"%s" opts nobody out and calls nothing off: the scheduler looks', (text) =>
    expect(understandReply(text)).toEqual({ meaning: 'unclear', mayCallOffVisit: true }),
  );
});

test.each([
  ['START', 'start'],
  ['UNSTOP', 'start'],
  ['help', 'help'],
  ['AYUDA', 'help'],
  ['I need help with the parking', 'unclear'],
  ['When do you start?', 'unclear'],
])('"%s" is %s', (text, meaning) => expect(meaningOf(text)).toBe(meaning));

test('any text is read without a fault', () => {
  fc.assert(
    fc.property(fc.string({ unit: 'grapheme', maxLength: 400 }), (text) => {
      expect(typeof meaningOf(text)).toBe('string');
    }),
  );
});

test('one strange word beside a yes is enough to leave it to a person', () => {
  const strange = fc.string({
    unit: fc.constantFrom('q', 'w', 'x', 'z', 'ж'),
    minLength: 2,
    maxLength: 8,
  });
  const yes = fc.constantFrom('yes', 'ok', 'si', 'claro', 'confirmed', '\u{1F44D}');
  fc.assert(
    fc.property(strange, yes, fc.boolean(), (word, answer, isFirst) => {
      expect(meaningOf(isFirst ? `${word} ${answer}` : `${answer}, ${word}`)).toBe('unclear');
      expect(meaningOf(answer)).toBe('yes');
    }),
  );
});

test('capitals, accents and punctuation do not matter', () => {
  for (const text of ['si', 'otro dia', 'no mas mensajes', 'help', 'change']) {
    const dressed = `  ¡${text.toUpperCase().replace('I', 'Í')}!! `;
    expect(meaningOf(dressed)).toBe(meaningOf(text));
  }
});
