import { betterAuth } from 'better-auth';
import { drizzleAdapter } from 'better-auth/adapters/drizzle';
import type { Database } from '@/db/database';
import { account, rateLimit, session, user, verification } from '@/db/schema';
import { database } from './database';
import { env } from './env';
import { signingSecret } from './secret';

function make(db: Database) {
  const { publicUrl, production } = env();
  return betterAuth({
    appName: 'Setwell',
    baseURL: publicUrl,
    secret: signingSecret(),
    trustedOrigins: [publicUrl],
    database: drizzleAdapter(db, {
      provider: 'pg',
      schema: { user, session, account, verification, rateLimit },
      transaction: false,
    }),
    emailAndPassword: { enabled: true, disableSignUp: true, minPasswordLength: 10 },
    session: {
      expiresIn: 60 * 60 * 24 * 30,
      updateAge: 60 * 60 * 24,
      additionalFields: { activeShopId: { type: 'string', required: false, input: false } },
    },
    rateLimit: {
      enabled: production,
      storage: 'database',
      window: 60,
      max: 120,
      customRules: { '/sign-in/email': { window: 60, max: 10 } },
    },
    // A shop's people sign in on borrowed phones; nothing of theirs is changed from the outside.
    disabledPaths: ['/update-user', '/delete-user', '/change-email', '/sign-up/email'],
    advanced: { useSecureCookies: publicUrl.startsWith('https:'), cookiePrefix: 'setwell' },
    telemetry: { enabled: false },
  });
}

export type Auth = ReturnType<typeof make>;
type Held = { __setwellAuth?: { db: Database; auth: Auth } };

/** Made when first asked, because the build must not open the database. */
export async function auth(): Promise<Auth> {
  const { db } = await database();
  const held = globalThis as Held;
  if (held.__setwellAuth?.db !== db) held.__setwellAuth = { db, auth: make(db) };
  return held.__setwellAuth.auth;
}
