/** One occasion in words: the text message and the e-mail, from the shop's wording or ours. */
import type { Outcome } from '@/lib/problem';
import type { Language } from '@/lib/time/text-locale';
import { emailHtml } from './email-html';
import type { Occasion } from './occasions';
import { plainSms } from './plain-sms';
import { type FieldValues, renderTemplate, type Wording } from './template';
import { templatesEn } from './templates-en';
import { templatesEs } from './templates-es';

export type RenderInput = {
  occasion: Occasion;
  language: Language;
  values: FieldValues;
  /** The shop's own words, where it has any. */
  ownWording?: Readonly<Partial<Wording>>;
};

export type RenderedEmail = { subject: string; text: string; html: string };

export const buttonWords: Record<Language, string> = { en: 'Open your visit', es: 'Ver su visita' };

/** What a new shop says on an occasion. */
export function usualWording(occasion: Occasion, language: Language): Wording {
  return language === 'es' ? templatesEs[occasion] : templatesEn[occasion];
}

/**
 * The text message, in letters that SMS carries cheaply, line ends as spaces where a value brought them in.
 * Example: 'on-my-way' in English: "Juniper Bend: we are on the way and arrive between 8:00 and 10:00 AM. …".
 * Problems: those of `renderTemplate`.
 */
export function renderSms(input: RenderInput): Outcome<string> {
  const rendered = renderTemplate(wordingOf(input).sms, oneLine(input.values));
  return rendered.value === null ? rendered : { value: plainSms(rendered.value), problems: [] };
}

/** Subject, text and HTML of the e-mail. The subject is one line, whatever a value brought in. */
export function renderEmail(input: RenderInput): Outcome<RenderedEmail> {
  const { language, values } = input;
  const wording = wordingOf(input);
  const subject = renderTemplate(wording.subject, oneLine(values));
  const text = renderTemplate(wording.email, { ...oneLine(values), ...linesOf(values) });
  if (subject.value === null || text.value === null) {
    return { value: null, problems: [...subject.problems, ...text.problems] };
  }
  const html = emailHtml({ text: text.value, language, buttonWords: buttonWords[language] });
  return { value: { subject: subject.value, text: text.value, html }, problems: [] };
}

function wordingOf({ occasion, language, ownWording }: RenderInput): Wording {
  return { ...usualWording(occasion, language), ...ownWording };
}

/** A list that is ours, each visit with its page on a line of its own; nothing in it was typed by anybody. */
function linesOf({ moves }: FieldValues): FieldValues {
  return moves === undefined ? {} : { moves };
}

/** A value with line ends could look like a paragraph or a header of its own. */
function oneLine(values: FieldValues): FieldValues {
  return Object.fromEntries(
    Object.entries(values).map(([field, value]) => [
      field,
      value?.replace(/\s*[\r\n\u2028\u2029]+\s*/g, ' '),
    ]),
  );
}
