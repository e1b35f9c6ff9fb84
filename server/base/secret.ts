import { createHash, randomBytes } from 'node:crypto';
import { mkdirSync, readFileSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { env } from './env';

/** The signing secret: from the environment, else made once and kept beside the data. */
export function signingSecret(): string {
  const { authSecret, dataDirectory } = env();
  if (authSecret) return authSecret;
  const file = path.join(dataDirectory, 'secret');
  mkdirSync(dataDirectory, { recursive: true });
  try {
    writeFileSync(file, randomBytes(32).toString('base64url'), { flag: 'wx', mode: 0o600 });
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== 'EEXIST') throw error;
  }
  return readFileSync(file, 'utf8');
}

/** 128 random bits for a link; only its hash is stored. */
export function newLinkToken(): string {
  return randomBytes(16).toString('base64url');
}

export function hashToken(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}
