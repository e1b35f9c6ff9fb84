import { z } from 'zod';

export type DemoPhone = {
  /** Every number and address that was written to, newest first. */
  numbers: string[];
  addresses: string[];
  number: string | null;
  address: string | null;
  texts: { id: string; body: string; at: string; isFromCustomer: boolean }[];
  mails: { id: string; subject: string; text: string; at: string; attachments: string[] }[];
};

export const demoReplyInput = z.object({
  number: z.string().regex(/^\+\d{8,15}$/),
  body: z.string().trim().min(1, 'Write something.').max(600),
});
export type DemoReplyInput = z.infer<typeof demoReplyInput>;
