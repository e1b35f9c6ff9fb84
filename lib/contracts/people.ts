import { z } from 'zod';
import { roles } from '@/lib/permissions';

const personName = z.string().trim().min(1, 'Give a name.').max(80);
const email = z.email('That is no e-mail address.').trim().toLowerCase().max(200);
const password = z.string().min(10, 'At least 10 characters.').max(128);

export const createShopInput = z.object({
  shopName: z.string().trim().min(1, 'Give the shop a name.').max(80),
  region: z.enum(['US', 'UK', 'AU', 'EU']),
  /** IANA zone, "America/New_York". */
  zone: z.string().min(1).max(60),
  unit: z.enum(['in', 'mm']),
  personName,
  email,
  password,
});
export type CreateShopInput = z.infer<typeof createShopInput>;

export const invitePersonInput = z.object({ email, role: z.enum(roles) });
export type InvitePersonInput = z.infer<typeof invitePersonInput>;

/** `invitationId` is the secret part of the link that the e-mail carried. */
export const joinShopInput = z.object({
  invitationId: z.string().min(10).max(60),
  personName,
  password,
});
export type JoinShopInput = z.infer<typeof joinShopInput>;

export const switchShopInput = z.object({ shopId: z.string().min(1).max(60) });

export const personView = z.object({
  id: z.uuid(),
  name: z.string(),
  role: z.enum(roles),
  email: z.string().nullable(),
});
export type PersonView = z.infer<typeof personView>;
