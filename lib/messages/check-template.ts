/** What is wrong with a shop's wording, said when it is saved. */
import type { Problem } from '@/lib/problem';
import type { Language } from '@/lib/time/text-locale';
import { type Field, fieldsOf, fieldWords, type Occasion } from './occasions';
import { plainCharacter, plainSms } from './plain-sms';
import { stopWords } from './reply-words';
import { sampleValues } from './sample-values';
import { countSegments } from './segments';
import { isField, readTemplate, renderTemplate, unknownField, type WordingPart } from './template';

export type TemplateUse = { occasion: Occasion; part: WordingPart; language: Language };

/** A text of more costs more than an e-mail is worth. */
const MOST_SEGMENTS = 2;

/**
 * Checks one template for its use; no problem means that it may be saved and sent as it is.
 * Example: "{shop}: see you {date}" names an unknown field; "Reply STOP to end" asks for an opt-out.
 * Problems: template-empty, template-brace, field-unknown, field-not-here, asks-for-opt-out, line-break
 * (errors: not saved); sms-without-shop, sms-character, sms-too-long (warnings).
 */
export function checkTemplate(template: string, use: TemplateUse): Problem[] {
  if (template.trim() === '') return [problem('template-empty', 'The text is empty.')];
  const { parts, problems } = readTemplate(template);
  const names = parts.flatMap((part) => ('field' in part ? [part.field] : []));
  for (const name of new Set(names)) {
    if (!isField(name)) problems.push(unknownField(name));
    else if (!fieldsOf[use.occasion].includes(name)) problems.push(notHere(name));
  }
  const optOut = askedOptOut(template);
  if (optOut) problems.push(asksForOptOut(optOut));
  if (use.part === 'subject' && /[\r\n]/.test(template)) {
    problems.push(problem('line-break', 'A subject is one line.'));
  }
  return use.part === 'sms' ? [...problems, ...checkSms(template, names, use)] : problems;
}

function checkSms(
  template: string,
  names: string[],
  { occasion, language }: TemplateUse,
): Problem[] {
  const problems = countSegments(template.replaceAll(/[{}]/g, '')).culprits.map((culprit) =>
    costlyCharacter(culprit.character, culprit.code),
  );
  if (!names.includes('shop')) {
    const message = 'The text does not say who writes: name the shop with {shop}.';
    problems.push({ ...problem('sms-without-shop', message), severity: 'warning' });
  }
  const sample = renderTemplate(template, sampleValues[language]).value;
  const { segments } = countSegments(plainSms(sample ?? ''));
  if (segments > MOST_SEGMENTS) {
    const message = `On ${occasion} this goes out as ${segments} messages. Over ${MOST_SEGMENTS}, shorten it.`;
    problems.push({ ...problem('sms-too-long', message), severity: 'warning' });
  }
  return problems;
}

/** Words that ask for an answer, in both languages. */
const askings =
  'reply|replying|text|texting|answer|send|write|respond|responda|conteste|envie|mande|escriba';

/**
 * An opt-out word that the text asks for: in capitals anywhere, or soon after a word of asking. Carriers
 * offer STOP by themselves, and a customer who is asked to write CANCEL would opt out.
 */
function askedOptOut(template: string): string | null {
  const words = stopWords.filter((word) => !word.includes(' '));
  const inCapitals = new RegExp(`\\b(${words.join('|').toUpperCase()})\\b`);
  const afterAsking = new RegExp(
    `\\b(?:${askings})\\b\\W+(?:\\w+\\W+){0,3}?(${words.join('|')})\\b`,
    'i',
  );
  return (inCapitals.exec(template) ?? afterAsking.exec(template))?.[1] ?? null;
}

function asksForOptOut(word: string): Problem {
  return problem(
    'asks-for-opt-out',
    `"${word}" opts a number out of all texts. Ask for YES or CHANGE, or give the phone number.`,
  );
}

function notHere(field: Field): Problem {
  return {
    ...problem(
      'field-not-here',
      `{${field}} (${fieldWords[field]}) has no value on this occasion.`,
    ),
    about: [field],
  };
}

function costlyCharacter(character: string, code: string): Problem {
  const instead = plainCharacter(character);
  const shown = /\s/.test(character) || instead === '' ? code : `"${character}" (${code})`;
  const message =
    instead === character
      ? `${shown} makes the text cost more than twice as much: 70 characters a message, not 160.`
      : `${shown} is sent as "${instead}": the letter itself would make the text cost more than twice as much.`;
  return { ...problem('sms-character', message), about: [character], severity: 'warning' };
}

function problem(code: string, message: string): Problem {
  return { code, message, about: [], severity: 'error' };
}
