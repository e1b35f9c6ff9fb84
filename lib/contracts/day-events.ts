/** What a crew tells from site, one event a tap; each is safe on the phone first and is sent in order. */
import { z } from 'zod';
import { reading } from './readings';
import { signOffFields } from './sign-offs';
import { closeFields, closeNeeds, isShownClosed, plainWords, snagFields } from './snags';

const id = z.uuid();

const common = {
  /** Made on the phone; sending it twice changes nothing. */
  id,
  visitId: id,
  /** When it was tapped, by the phone's clock. */
  at: z.iso.datetime(),
};

export const pauseReasons = ['break', 'parts', 'for-the-day', 'other'] as const;
export type PauseReason = (typeof pauseReasons)[number];
export const checkAnswers = ['yes', 'no', 'not-here'] as const;
export type CheckAnswer = (typeof checkAnswers)[number];

export const pauseEvent = z.object({
  ...common,
  what: z.literal('pause'),
  why: z.enum(pauseReasons),
});
export const goOnEvent = z.object({ ...common, what: z.literal('go-on') });

/** One line of the checklist; the newest answer holds. */
export const checkEvent = z.object({
  ...common,
  what: z.literal('check'),
  item: z.string().min(1).max(60),
  answer: z.enum(checkAnswers),
  words: plainWords(400).default(''),
});

export const snagEvent = z.object({ ...common, what: z.literal('snag'), ...snagFields });

export const closeSnagEvent = z.object({
  ...common,
  what: z.literal('close-snag'),
  snagId: id,
  ...closeFields,
});

/** Readings taken again before setting, against the release that the crew sets by. */
export const asFoundEvent = z.object({
  ...common,
  what: z.literal('as-found'),
  releaseId: id,
  readings: z.array(reading).min(1).max(24),
  /** What the phone said of them then; the office works it out again for itself. */
  said: z.object({
    disagreements: z.array(plainWords(300)).max(24),
    changes: z.array(plainWords(300)).max(60),
  }),
});

export const signOffEvent = z.object({ ...common, what: z.literal('sign-off'), ...signOffFields });

/** The access code was looked at on the phone. */
export const codeSeenEvent = z.object({ ...common, what: z.literal('code-seen') });

export const dayEvent = z
  .discriminatedUnion('what', [
    pauseEvent,
    goOnEvent,
    checkEvent,
    snagEvent,
    closeSnagEvent,
    asFoundEvent,
    signOffEvent,
    codeSeenEvent,
  ])
  .refine((event) => event.what !== 'close-snag' || isShownClosed(event), {
    path: ['words'],
    message: closeNeeds,
  });
export type DayEvent = z.infer<typeof dayEvent>;
export type DayEventOf<What extends DayEvent['what']> = Extract<DayEvent, { what: What }>;

/** As sent: each is read alone, so that a bad one does not hold up the rest. */
export const dayEventsInput = z.object({ events: z.array(z.unknown()).min(1).max(100) });
export type DayEventsInput = z.infer<typeof dayEventsInput>;
export type DayEventsAnswer = {
  /** Safe with the office: these may leave the phone. */
  accepted: string[];
  /** Not taken, with why: the phone keeps and shows them. */
  parked: { id: string; message: string }[];
};
