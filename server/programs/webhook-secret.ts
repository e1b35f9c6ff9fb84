import { createHmac } from 'node:crypto';
import { signingSecret } from '@/server/base/secret';

/** Made from the webhook's id, so that who reads the database alone cannot sign in our name. */
export function webhookSecret(webhookId: string): string {
  const key = createHmac('sha256', signingSecret()).update(`webhook:${webhookId}`).digest('base64');
  return `whsec_${key}`;
}

/**
 * The signature of one delivery: HMAC-SHA256 over "id.timestamp.body", base64, with its version before it.
 * Source: Standard Webhooks specification, "Signature scheme".
 */
export function webhookSignature(
  secret: string,
  sent: { id: string; timestampS: number; body: string },
): string {
  const key = Buffer.from(secret.replace(/^whsec_/, ''), 'base64');
  const content = `${sent.id}.${sent.timestampS}.${sent.body}`;
  return `v1,${createHmac('sha256', key).update(content).digest('base64')}`;
}
