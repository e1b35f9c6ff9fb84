import type { DemoPhone } from '@/lib/contracts/demo';
import { demoFakes } from './demo-only';

/** What the customer's phone and inbox hold: what the fakes received, and nothing else. */
export async function readPhone(chosen: { number?: string; address?: string }): Promise<DemoPhone> {
  const { sms, email } = await demoFakes();
  const numbers = sms?.numbers() ?? [];
  const addresses = email?.addresses() ?? [];
  const number = chosen.number ?? (chosen.address ? undefined : numbers[0]);
  // At night there is an e-mail only: the text waits for the morning.
  const address = chosen.address ?? (number ? undefined : addresses[0]);
  return {
    numbers: shownFirst(numbers, number),
    addresses: shownFirst(addresses, address),
    number: number ?? null,
    address: address ?? null,
    texts: number
      ? (sms?.messagesFor(number) ?? []).map(({ sid, body, createdAt, from }) => ({
          id: sid,
          body,
          at: createdAt,
          isFromCustomer: from === number,
        }))
      : [],
    mails: address
      ? (email?.mailsFor(address) ?? []).map(({ id, subject, text, receivedAt, attachments }) => ({
          id,
          subject,
          text,
          at: receivedAt,
          attachments: attachments.map(({ filename }) => filename),
        }))
      : [],
  };
}

function shownFirst(all: string[], shown: string | undefined): string[] {
  return shown && all.includes(shown) ? [shown, ...all.filter((each) => each !== shown)] : all;
}
