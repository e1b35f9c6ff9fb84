import { createCipheriv, createDecipheriv, createHmac, hkdfSync, randomBytes } from 'node:crypto';
import { env } from './env';
import { signingSecret } from './secret';

/**
 * What the database keeps and must not be able to read, and what it keeps and must not be able to change
 * unseen. The key comes from the environment, else from the secret that lies beside the data, so that a
 * copy of the database alone opens nothing.
 */
const keyOf = (purpose: string): Buffer =>
  Buffer.from(hkdfSync('sha256', env().sealingKey ?? signingSecret(), 'setwell', purpose, 32));

const version = 'v1';
const nonceBytes = 12;
const tagBytes = 16;

/** AES-256-GCM; `belongsTo` is bound in, so that a sealed text copied to another row does not open. */
export function sealText(text: string, belongsTo: string): string {
  const nonce = randomBytes(nonceBytes);
  const cipher = createCipheriv('aes-256-gcm', keyOf('sealed text'), nonce);
  cipher.setAAD(Buffer.from(belongsTo));
  const body = Buffer.concat([cipher.update(text, 'utf8'), cipher.final()]);
  const box = Buffer.concat([nonce, body, cipher.getAuthTag()]);
  return `${version}.${box.toString('base64url')}`;
}

/** Null when it does not open: another key, another row, or bytes that somebody changed. */
export function openText(sealed: string, belongsTo: string): string | null {
  const [mark, encoded = ''] = sealed.split('.');
  const box = Buffer.from(encoded, 'base64url');
  if (mark !== version || box.length < nonceBytes + tagBytes) return null;
  try {
    const nonce = box.subarray(0, nonceBytes);
    const opener = createDecipheriv('aes-256-gcm', keyOf('sealed text'), nonce);
    opener.setAAD(Buffer.from(belongsTo));
    opener.setAuthTag(box.subarray(-tagBytes));
    const body = box.subarray(nonceBytes, -tagBytes);
    return Buffer.concat([opener.update(body), opener.final()]).toString('utf8');
  } catch {
    return null;
  }
}

/** A mark over a record that only the holder of the key can make. */
export function sealRecord(text: string): string {
  return `${version}.${createHmac('sha256', keyOf('sealed record')).update(text).digest('base64url')}`;
}
