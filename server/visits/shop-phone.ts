import { toE164 } from '@/lib/messages/phone-number';
import type { Shop } from '@/server/base/context';

/** The shop's phone as people of its country write it. */
export function shopPhoneWords({ phone, region }: Shop): string {
  return toE164(phone, region).value?.national ?? phone;
}
