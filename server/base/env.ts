import path from 'node:path';
import { z } from 'zod';

const smsSettings = ['SMS_ACCOUNT_SID', 'SMS_AUTH_TOKEN', 'SMS_FROM'] as const;

/** The one place that reads the environment. */
const settings = z.object({
  DATABASE_URL: z.string().optional(),
  SETWELL_DATA: z.string().default('.data'),
  SETWELL_BACK_UPS: z.string().optional(),
  SETWELL_DEMO: z.enum(['0', '1']).default('0'),
  PUBLIC_URL: z.url().default('http://localhost:3000'),
  BETTER_AUTH_SECRET: z.string().min(16).optional(),
  SETWELL_SEALING_KEY: z.string().min(16).optional(),
  SMS_ACCOUNT_SID: z.string().optional(),
  SMS_AUTH_TOKEN: z.string().optional(),
  SMS_FROM: z.string().optional(),
  SMTP_URL: z.string().optional(),
  TRAVEL_URL: z.url().optional(),
  GEOCODE_URL: z.url().optional(),
  TILES_URL: z
    .string()
    .refine((text) => ['{z}', '{x}', '{y}'].every((part) => text.includes(part)), {
      message: 'must have {z}, {x} and {y} in it',
    })
    .optional(),
  TILES_ATTRIBUTION: z.string().default(''),
  EMAIL_FROM: z.string().optional(),
  FILES_BUCKET: z.string().optional(),
  FILES_REGION: z.string().default('us-east-1'),
  FILES_ENDPOINT: z.url().optional(),
  NODE_ENV: z.enum(['development', 'test', 'production']).default('development'),
  NEXT_PHASE: z.string().optional(),
});

/** A service that is half set would be a fake that nobody knows of: the program does not start with one. */
const wholeSettings = settings.superRefine((read, problems) => {
  const missing = smsSettings.filter((name) => !read[name]);
  if (missing.length > 0 && missing.length < smsSettings.length) {
    const message = `is missing: texts need ${smsSettings.join(', ')} together`;
    for (const name of missing) problems.addIssue({ code: 'custom', path: [name], message });
  }
  if (read.SMTP_URL && !read.EMAIL_FROM) {
    const message = 'is missing: with SMTP_URL, say whom e-mail is from';
    problems.addIssue({ code: 'custom', path: ['EMAIL_FROM'], message });
  }
});

export type Env = {
  databaseUrl: string | null;
  dataDirectory: string;
  backUpDirectory: string;
  demo: boolean;
  publicUrl: string;
  authSecret: string | null;
  /** For access codes and signatures; without it they hang on the signing secret. */
  sealingKey: string | null;
  sms: { accountSid: string; authToken: string; from: string } | null;
  smtpUrl: string | null;
  emailFrom: string;
  /** Where files lie when not in the data folder. */
  filesBucket: { bucket: string; region: string; endpoint: string | null } | null;
  travelUrl: string | null;
  geocodeUrl: string | null;
  /** Of the map: an address with {z}, {x} and {y}, and who is to be named for it. */
  tiles: { url: string; attribution: string } | null;
  production: boolean;
  building: boolean;
};

/** What is set; empty counts as not set. Throws with a line for each setting that must be put right. */
export function env(from: NodeJS.ProcessEnv = process.env): Env {
  const given = Object.fromEntries(Object.entries(from).filter(([, value]) => value !== ''));
  const { data: read, error } = wholeSettings.safeParse(given);
  if (!read) {
    const lines = error.issues.map(({ path, message }) => `  ${path.join('.')}: ${message}`);
    throw new Error(`Settings to put right (README has them all):\n${lines.join('\n')}`);
  }
  const sms = read.SMS_ACCOUNT_SID && read.SMS_AUTH_TOKEN && read.SMS_FROM;
  const fromHere = (folder: string) =>
    path.resolve(/*turbopackIgnore: true*/ process.cwd(), folder);
  return {
    databaseUrl: read.DATABASE_URL ?? null,
    dataDirectory: fromHere(read.SETWELL_DATA),
    backUpDirectory: fromHere(read.SETWELL_BACK_UPS ?? path.join(read.SETWELL_DATA, 'back-ups')),
    demo: read.SETWELL_DEMO === '1',
    publicUrl: read.PUBLIC_URL.replace(/\/$/, ''),
    authSecret: read.BETTER_AUTH_SECRET ?? null,
    sealingKey: read.SETWELL_SEALING_KEY ?? null,
    sms: sms
      ? {
          accountSid: read.SMS_ACCOUNT_SID as string,
          authToken: read.SMS_AUTH_TOKEN as string,
          from: read.SMS_FROM as string,
        }
      : null,
    smtpUrl: read.SMTP_URL ?? null,
    emailFrom: read.EMAIL_FROM ?? 'Setwell <no-reply@setwell.example>',
    filesBucket: read.FILES_BUCKET
      ? {
          bucket: read.FILES_BUCKET,
          region: read.FILES_REGION,
          endpoint: read.FILES_ENDPOINT ?? null,
        }
      : null,
    travelUrl: read.TRAVEL_URL ?? null,
    tiles: read.TILES_URL ? { url: read.TILES_URL, attribution: read.TILES_ATTRIBUTION } : null,
    geocodeUrl: read.GEOCODE_URL ?? null,
    production: read.NODE_ENV === 'production',
    building: read.NEXT_PHASE === 'phase-production-build',
  };
}
