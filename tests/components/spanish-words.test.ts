import { describe, expect, test } from 'vitest';
import { regionalWords } from '@/components/customer/customer-words';
import { wordsEs } from '@/components/customer/words-es';
import { missingThings, missingWords } from '@/lib/messages/missing-words';
import { occasions } from '@/lib/messages/occasions';
import { buttonWords, usualWording } from '@/lib/messages/render-message';
import { callMeWords, notReadyWords, otherTimeWords, saidBack } from '@/lib/messages/said-words';
import { sampleValues } from '@/lib/messages/sample-values';
import { wordingParts } from '@/lib/messages/template';
import { visitInWords } from '@/lib/messages/visit-words';
import { visitKinds } from '@/lib/schedule';
import { spanishTradeWord, tradeTerms, tradeWord } from '@/lib/words/trade';

const regions = ['US', 'UK', 'AU', 'EU'] as const;

/** Every text of a page, with the functions called on what they are given. */
function textsIn(words: unknown): string[] {
  if (typeof words === 'string') return [words];
  if (typeof words === 'function') return [words(['Ines', 'Bram'], '9:30'), words([], '')];
  return Object.values(words ?? {}).flatMap(textsIn);
}

/** What a customer who reads Spanish is shown: pages, texts, e-mails and what fills their fields. */
const customerTexts = regions.flatMap((region) => [
  ...textsIn(wordsEs).map((text) => regionalWords(text, { language: 'es', region })),
  ...visitKinds.map((kind) => visitInWords(kind, { language: 'es', region })),
]);
const messageTexts = [
  ...occasions.flatMap((occasion) => {
    const wording = usualWording(occasion, 'es');
    return wordingParts.map((part) => wording[part].replaceAll(/\{\w+\}/g, ''));
  }),
  ...missingThings.map((thing) => missingWords([thing], '', 'es')),
  ...[callMeWords(''), otherTimeWords(''), notReadyWords([], '')].map((says) =>
    saidBack(says, 'es'),
  ),
  ...[
    sampleValues.es.visit,
    sampleValues.es.choices,
    sampleValues.es.reason,
    sampleValues.es.missing,
  ],
  buttonWords.es,
];

/** The trade's English, and what an English page says most. */
const english = new Set([
  ...tradeTerms.flatMap((term) => regions.map((region) => tradeWord(term, region))),
  ...['cabinet', 'cabinets', 'install', 'measure', 'measurement', 'delivery', 'template', 'scribe'],
  ...[
    'shop',
    'crew',
    'kitchen',
    'sink',
    'floor',
    'power',
    'visit',
    'booked',
    'window',
    'job',
    'site',
  ],
  ...['the', 'and', 'your', 'you', 'we', 'our', 'for', 'please', 'when', 'call', 'time', 'link'],
]);
const spanish = new Set(
  tradeTerms.flatMap((term) => regions.map((region) => spanishTradeWord(term, region))),
);
const onlyEnglish = [...english].filter((word) => !spanish.has(word));
const inEnglish = new RegExp(`(?<![\\p{L}])(${onlyEnglish.join('|')})s?(?![\\p{L}])`, 'iu');

describe('what a customer reads in Spanish', () => {
  test.each([...new Set([...customerTexts, ...messageTexts])].filter((text) => text !== ''))(
    'carries no English word: %s',
    (text) => expect(inEnglish.exec(text)?.[0]).toBeUndefined(),
  );

  test('would be found in English', () => {
    for (const text of [
      'Despeje los countertops',
      'su install del martes',
      'La crew va en camino',
    ]) {
      expect(inEnglish.exec(text)).not.toBeNull();
    }
  });

  test('speaks to them as usted', () => {
    const familiar =
      /(?<![\p{L}])(tú|tu|tus|te|ti|tienes|puedes|quieres|vosotros|vuestra?s?)(?![\p{L}])/iu;
    expect([...customerTexts, ...messageTexts].filter((text) => familiar.test(text))).toEqual([]);
  });

  test('names who comes in the right number', () => {
    expect(wordsEs.comes(['Ines', 'Bram'], wordsEs.what.install)).toBe(
      'Ines y Bram vendrán a instalar sus gabinetes en',
    );
    expect(wordsEs.comes(['Ines'], wordsEs.what.install)).toContain('Ines vendrá');
    expect(wordsEs.comes([], wordsEs.what.install)).toBe('Vendremos a instalar sus gabinetes en');
  });
});
