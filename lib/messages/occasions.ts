/** The occasions on which a customer is told, and what each may say. */

export const occasions = [
  'booked',
  'please-confirm',
  'day-before',
  'on-my-way',
  'running-late',
  'moved',
  'called-off',
  'done',
] as const;
export type Occasion = (typeof occasions)[number];

export const occasionWords: Record<Occasion, string> = {
  booked: 'Booked',
  'please-confirm': 'Please confirm',
  'day-before': 'The day before',
  'on-my-way': 'On my way',
  'running-late': 'Running late',
  moved: 'Moved',
  'called-off': 'Called off',
  done: 'Done',
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
  reason: 'why it is called off',
} as const;
export type Field = keyof typeof fieldWords;

const always: readonly Field[] = ['shop', 'shopPhone', 'customer', 'visit', 'address', 'crew'];
const withTime: readonly Field[] = [...always, 'day', 'window', 'link'];

/** Fields that have a value on each occasion. */
export const fieldsOf: Record<Occasion, readonly Field[]> = {
  booked: withTime,
  'please-confirm': withTime,
  'day-before': withTime,
  'on-my-way': withTime,
  'running-late': [...withTime, 'minutesLate'],
  moved: [...withTime, 'oldDay', 'oldWindow'],
  'called-off': [...always, 'day', 'reason'],
  done: [...always, 'day', 'link'],
};
