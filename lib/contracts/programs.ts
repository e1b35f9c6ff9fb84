/** A door for other programs: keys with scopes, and where a shop wants to be told of what. */
import { z } from 'zod';
import type { Permission } from '@/lib/permissions';

/** What a key may be given. Rules, people, keys themselves and a customer's data are for people alone. */
export const keyScopes = [
  'jobs:read',
  'jobs:change',
  'visits:read',
  'visits:book',
  'walls:read',
  'sheets:read',
  'sheets:say-ready',
  'messages:read',
  'numbers:read',
] as const satisfies readonly Permission[];

export const programEvents = [
  'visit.booked',
  'visit.confirmed',
  'visit.moved',
  'visit.called-off',
  'sheet.released',
  'job.signed-off',
] as const;
export type ProgramEvent = (typeof programEvents)[number];

export const makeKeyInput = z.object({
  name: z.string().trim().min(1, 'Say which program it is for.').max(80),
  scopes: z.array(z.enum(keyScopes)).min(1, 'Choose what it may.'),
});
export type MakeKeyInput = z.infer<typeof makeKeyInput>;

export const keyView = z.object({
  id: z.uuid(),
  name: z.string(),
  scopes: z.array(z.string()),
  madeByName: z.string(),
  madeAtWords: z.string(),
  lastUsedWords: z.string().nullable(),
});
export type KeyView = z.infer<typeof keyView>;

/** The key itself is shown this once. */
export type MadeKey = { id: string; key: string };

export const keyIdInput = z.object({ keyId: z.uuid() });
export type KeyIdInput = z.infer<typeof keyIdInput>;

export const addWebhookInput = z.object({
  url: z.url('Give the whole address, with https://.').max(500),
  events: z.array(z.enum(programEvents)).min(1, 'Choose what to tell.'),
});
export type AddWebhookInput = z.infer<typeof addWebhookInput>;

export const webhookView = z.object({
  id: z.uuid(),
  url: z.string(),
  events: z.array(z.enum(programEvents)),
  /** Told, still to tell, given up: of the last 30 days. */
  taken: z.number().int(),
  waiting: z.number().int(),
  givenUp: z.number().int(),
  lastAnswer: z.string(),
});
export type WebhookView = z.infer<typeof webhookView>;

/** The secret by which their program knows that it is us; shown to the owner when asked for. */
export type AddedWebhook = { id: string; secret: string };

export const webhookIdInput = z.object({ webhookId: z.uuid() });
export type WebhookIdInput = z.infer<typeof webhookIdInput>;

export type ProgramsView = { keys: KeyView[]; webhooks: WebhookView[] };
