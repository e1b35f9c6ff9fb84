/** The occasions on which a customer is told, and what each may say. */

export const occasions = [
  'booked',
  'please-confirm',
  'asked-again',
  'day-before',
  'on-my-way',
  'running-late',
  'moved',
  'moved-together',
  'called-off',
  'missed',
  'not-ready',
  'done',
  'other-time',
  'which-visit',
  'help',
] as const;
export type Occasion = (typeof occasions)[number];

/** Answers to a text of the customer's: by text alone, and never switched off. */
export const textAnswers = ['other-time', 'which-visit', 'help'] as const;

/** Example: 'help' is told by text alone, 'moved' by text and by e-mail. */
export function isTextAnswer(occasion: string): boolean {
  return textAnswers.some((answer) => answer === occasion);
}

/** What a shop may keep silent on: no answer to a customer, and visits that move together go with "moved". */
export function maySilence(occasion: Occasion): boolean {
  return !isTextAnswer(occasion) && occasion !== 'moved-together';
}

/** Known occasions only. */
export function parseOccasion(text: string): Occasion | null {
  return occasions.find((occasion) => occasion === text) ?? null;
}

export const occasionWords: Record<Occasion, string> = {
  booked: 'Booked',
  'please-confirm': 'Please confirm',
  'asked-again': 'Asked again',
  'day-before': 'The day before',
  'on-my-way': 'On my way',
  'running-late': 'Running late',
  moved: 'Moved',
  'moved-together': 'Moved, several visits',
  'called-off': 'Called off',
  missed: 'Nobody home',
  'not-ready': 'Not ready, noted',
  done: 'Done',
  'other-time': 'Asks for another time',
  'which-visit': 'Which visit?',
  help: 'Asks who you are',
};

/** When each goes out, for the shop that writes its own words. */
export const occasionWhen: Record<Occasion, string> = {
  booked: 'At once, when a visit is booked.',
  'please-confirm': 'At 10:00, 7 days before an install and 2 days before any other visit.',
  'asked-again': 'At 10:00, 4 days before an install and the day before any other, if silent.',
  'day-before': 'At 16:00 on the day before.',
  'on-my-way': 'When the crew taps "On my way".',
  'running-late': 'When the crew taps "Running late" and says how long.',
  moved: 'At once, when a visit is moved to another arrival.',
  'moved-together': 'In place of "Moved", when several visits of one customer move at once.',
  'called-off': 'At once, when a visit is called off.',
  missed: 'When the crew taps "Nobody home".',
  'not-ready': 'When the customer says on their page that something is not ready.',
  done: 'When the crew taps "Done", or with the copy when the customer has signed.',
  'other-time': 'Answers a text that asks for another time.',
  'which-visit': 'Answers a YES or CHANGE that two visits wait for.',
  help: 'Answers HELP.',
};

/** What a template may name, in braces, and what stands there. */
export const fieldWords = {
  shop: "the shop's name",
  shopPhone: "the shop's phone",
  customer: "the customer's name",
  visit: 'what is booked: site measure, install …',
  day: 'the day',
  window: 'the arrival window, "between 8:00 and 10:00 AM"',
  address: 'street and town of the site',
  crew: 'who comes',
  link: "the customer's page for this visit",
  oldDay: 'the day before it was moved',
  oldWindow: 'the window before it was moved',
  minutesLate: 'how many minutes late',
  arrival: 'when a late crew now arrives, "about 11:30 AM"',
  reason: 'why it is called off',
  missing: 'what the customer says is not ready',
  moves: 'each visit that moves, with its new time and its page',
  choices: 'the visits to choose from, each with its number',
} as const;
export type Field = keyof typeof fieldWords;

const always: readonly Field[] = ['shop', 'shopPhone', 'customer', 'visit', 'address', 'crew'];
const withTime: readonly Field[] = [...always, 'day', 'window', 'link'];

/** Fields that have a value on each occasion. */
export const fieldsOf: Record<Occasion, readonly Field[]> = {
  booked: withTime,
  'please-confirm': withTime,
  'asked-again': withTime,
  'day-before': withTime,
  'on-my-way': withTime,
  'running-late': [...withTime, 'minutesLate', 'arrival'],
  moved: [...withTime, 'oldDay', 'oldWindow'],
  'moved-together': ['shop', 'shopPhone', 'customer', 'moves'],
  'called-off': [...always, 'day', 'reason'],
  missed: [...always, 'day', 'link'],
  'not-ready': [...withTime, 'missing'],
  done: [...always, 'day', 'link'],
  'other-time': withTime,
  'which-visit': ['shop', 'shopPhone', 'customer', 'choices'],
  help: ['shop', 'shopPhone', 'customer'],
};
