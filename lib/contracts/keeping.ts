/** Giving a customer's data out, and forgetting a customer. */
import { z } from 'zod';

export const customerIdInput = z.object({ customerId: z.uuid() });
export type CustomerIdInput = z.infer<typeof customerIdInput>;

/** What an erasure takes away, and what stands against it; shown before the name is typed. */
export const erasureView = z.object({
  customerName: z.string(),
  jobs: z.number().int(),
  visits: z.number().int(),
  messages: z.number().int(),
  files: z.number().int(),
  signatures: z.number().int(),
  /** Booked visits to call off first; while there is one, nothing can be erased. */
  openVisits: z.number().int(),
  erasedAt: z.iso.datetime().nullable(),
});
export type ErasureView = z.infer<typeof erasureView>;

/** The name is typed once more, so that nobody is forgotten by a slip of the hand. */
export const eraseCustomerInput = customerIdInput.extend({ nameAgain: z.string().max(200) });
export type EraseCustomerInput = z.infer<typeof eraseCustomerInput>;
