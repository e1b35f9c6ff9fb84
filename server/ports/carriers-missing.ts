import { env } from '@/server/base/env';

export type Carrier = 'texts' | 'e-mail';

/** What nobody carries yet, so that it stays on this machine; in the demo that is as it should be. */
export function carriersMissing(): Carrier[] {
  const { demo, sms, smtpUrl } = env();
  if (demo) return [];
  const missing: Carrier[] = [];
  if (!sms) missing.push('texts');
  if (!smtpUrl) missing.push('e-mail');
  return missing;
}
