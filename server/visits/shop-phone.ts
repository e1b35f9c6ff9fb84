import { phoneWords } from '@/lib/messages/phone-number';
import type { Shop } from '@/server/base/context';

/** The shop's phone as people of its country write it. */
export function shopPhoneWords({ phone, region }: Shop): string {
  return phoneWords(phone, region);
}
