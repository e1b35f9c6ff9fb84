import { z } from 'zod';

const id = z.uuid();

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
