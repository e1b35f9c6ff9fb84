/** Message templates: plain text with named fields in braces, checked when saved and filled when sent. */
import type { Outcome, Problem } from '@/lib/problem';
import { type Field, fieldWords, type Occasion } from './occasions';

/** One occasion's wording. The HTML of the e-mail is made from its text. */
export type Wording = { sms: string; subject: string; email: string };
export type WordingPart = keyof Wording;
export const wordingParts = ['sms', 'subject', 'email'] as const satisfies WordingPart[];
export type OccasionTemplates = Record<Occasion, Wording>;

export type FieldValues = Readonly<Partial<Record<Field, string>>>;

type Part = { text: string } | { field: string };

/**
 * Fills a template. A field that is unknown, or has no value here, gives no text at all rather than a hole.
 * Values are taken as they are: braces in them mean nothing. Spaces left over by an empty value go, and so
 * does a full stop after one ("a la 1:00 p.m.."); a shop without a phone does not say "Questions: ".
 * Example: "{shop}: we come {day}." with shop "Juniper Bend" and day "Tue, May 12" is
 * "Juniper Bend: we come Tue, May 12.".
 * Problems: template-brace, field-unknown, field-without-value (errors).
 */
export function renderTemplate(template: string, values: FieldValues): Outcome<string> {
  const { parts: written, problems } = readTemplate(template);
  const parts = values.shopPhone === '' ? withoutPhone(written) : written;
  const texts: string[] = [];
  for (const part of parts) {
    if ('text' in part) texts.push(part.text);
    else if (!isField(part.field)) problems.push(unknownField(part.field));
    else {
      const value = values[part.field];
      if (value === undefined) problems.push(withoutValue(part.field));
      else texts.push(value);
    }
  }
  if (problems.length > 0) return { value: null, problems };
  const value = texts
    .join('')
    .replace(/[ \t]+$/gm, '')
    .replace(/\n{3,}/g, '\n\n')
    .replace(/(?<!\.)\.\.(?!\.)/g, '.')
    .trim();
  return { value, problems: [] };
}

/** Each phone goes with what stands around it in its sentence, up to the field before and the one after. */
function withoutPhone(parts: Part[]): Part[] {
  const isPhone = (part: Part | undefined) =>
    part !== undefined && 'field' in part && part.field === 'shopPhone';
  return parts
    .map((part, index): Part => {
      if (!('text' in part)) return part;
      let { text } = part;
      if (isPhone(parts[index - 1])) text = text.replace(/^[^.!?\n]*[.!?]?/, '');
      if (isPhone(parts[index + 1])) text = text.replace(/(^|[.!?]|\n)[^.!?\n]*$/, '$1');
      return { text };
    })
    .filter((part) => !isPhone(part));
}

/** The text and the fields of a template, in order; a lone brace is a problem and stands as text. */
export function readTemplate(template: string): { parts: Part[]; problems: Problem[] } {
  const pieces = template.split(/(\{[A-Za-z]+\})/);
  const parts = pieces
    .filter((piece) => piece !== '')
    .map((piece): Part => {
      const field = /^\{([A-Za-z]+)\}$/.exec(piece)?.[1];
      return field === undefined ? { text: piece } : { field };
    });
  const hasLoneBrace = parts.some((part) => 'text' in part && /[{}]/.test(part.text));
  return { parts, problems: hasLoneBrace ? [loneBrace] : [] };
}

export function isField(name: string): name is Field {
  return Object.hasOwn(fieldWords, name);
}

export function unknownField(name: string): Problem {
  return {
    code: 'field-unknown',
    message: `There is no field {${name}}. Known are ${Object.keys(fieldWords).join(', ')}.`,
    about: [name],
    severity: 'error',
  };
}

function withoutValue(field: Field): Problem {
  return {
    code: 'field-without-value',
    message: `{${field}} (${fieldWords[field]}) has no value here.`,
    about: [field],
    severity: 'error',
  };
}

const loneBrace: Problem = {
  code: 'template-brace',
  message: 'A brace stands alone. Fields are written {day}, with both braces and letters only.',
  about: [],
  severity: 'error',
};
