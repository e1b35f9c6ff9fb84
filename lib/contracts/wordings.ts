/** What a shop says on each occasion, on the wire. */
import { z } from 'zod';
import { occasions } from '@/lib/messages/occasions';

export const wordingView = z.object({
  occasion: z.enum(occasions),
  language: z.enum(['en', 'es']),
  sms: z.string(),
  subject: z.string(),
  email: z.string(),
  /** The shop has words of its own for some part of it. */
  isOwn: z.boolean(),
});
export type WordingView = z.infer<typeof wordingView>;

export const messageSettingsView = z.object({
  silentOn: z.array(z.enum(occasions)),
  /** What the provider asks for one message of a text; null: not known. */
  segmentPrice: z.number().nullable(),
  currency: z.string(),
});
export type MessageSettingsView = z.infer<typeof messageSettingsView>;

export type WordingsView = { wordings: WordingView[]; settings: MessageSettingsView };

/** A part that is empty, or says what we say, is left to us. */
export const saveWordingInput = z.object({
  occasion: z.enum(occasions),
  language: z.enum(['en', 'es']),
  sms: z.string().trim().max(1_000),
  subject: z.string().trim().max(200),
  email: z.string().trim().max(6_000),
});
export type SaveWordingInput = z.infer<typeof saveWordingInput>;

export const saveMessageSettingsInput = z.object({
  silentOn: z.array(z.enum(occasions)).max(occasions.length),
  segmentPrice: z.number().min(0, 'A price is not less than nothing.').max(10).nullable(),
  currency: z.string().regex(/^[A-Z]{3}$/, 'Write the currency as USD, GBP, EUR …'),
});
export type SaveMessageSettingsInput = z.infer<typeof saveMessageSettingsInput>;
