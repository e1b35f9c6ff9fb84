import { z } from 'zod';

const id = z.uuid();

/** What a message must say that its visit no longer tells. Instants as ISO text. */
export type MessageCause = {
  /** Moved or called off: the arrival that the customer was told last. */
  toldFrom?: string;
  toldUntil?: string;
  /** Called off: why. */
  reason?: string;
};

export const messageView = z.object({
  id,
  jobId: id.nullable(),
  customerName: z.string(),
  occasion: z.string(),
  channel: z.enum(['sms', 'email']),
  state: z.enum(['waiting', 'sending', 'sent', 'delivered', 'refused', 'withdrawn', 'received']),
  dueAtWords: z.string(),
  reason: z.string(),
  body: z.string(),
});
export type MessageView = z.infer<typeof messageView>;

export const listMessagesInput = z.object({ jobId: id.optional() });
export type ListMessagesInput = z.infer<typeof listMessagesInput>;
