import type { DemoReplyInput } from '@/lib/contracts/demo';
import { demoFakes } from './demo-only';

/** Texts back as the customer would: through the fake provider's signed webhook. */
export async function replyAsCustomer({ number, body }: DemoReplyInput): Promise<void> {
  const { sms } = await demoFakes();
  await sms?.inbound({ from: number, body });
}
