import { createHmac } from 'node:crypto';
import { apiPaths } from '@/lib/paths';
import { env } from '@/server/base/env';
import { signingSecret } from '@/server/base/secret';

const tokenBytes = 16;

/**
 * Made from the feed's id and the signing secret, so that the office can copy the address again, though only
 * the token's hash is stored: who reads the database alone cannot read a calendar.
 */
export function feedToken(feedId: string): string {
  return createHmac('sha256', signingSecret())
    .update(`calendar-feed:${feedId}`)
    .digest()
    .subarray(0, tokenBytes)
    .toString('base64url');
}

export function feedAddress(feedId: string): string {
  return `${env().publicUrl}${apiPaths.feed(feedToken(feedId))}`;
}
