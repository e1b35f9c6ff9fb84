/**
 * Who carries texts and e-mail, and knows roads and addresses: the real services where the environment
 * names them, and fakes on loopback for what it does not, started once a process and held over a reload.
 */
import { randomBytes } from 'node:crypto';
import path from 'node:path';
import { apiPaths } from '@/lib/paths';
import { type Env, env } from '@/server/base/env';
import type { EmailPort } from './email/email-port';
import { type FakeEmail, startFakeEmail } from './email/fake-email';
import { smtpEmail } from './email/smtp-email';
import { type FakeGeocode, startFakeGeocode } from './geocode/fake-geocode';
import type { GeocodePort } from './geocode/geocode-port';
import { nominatimGeocode } from './geocode/nominatim-geocode';
import { type FakeSms, startFakeSms } from './sms/fake-sms';
import type { SmsPort } from './sms/sms-port';
import { twilioSms } from './sms/twilio-sms';
import { type FakeTravel, startFakeTravel } from './travel/fake-travel';
import { osrmTravel } from './travel/osrm-travel';
import type { TravelPort } from './travel/travel-port';

export type Ports = {
  sms: SmsPort;
  email: EmailPort;
  travel: TravelPort;
  geocode: GeocodePort;
  /** Null where the real service is used. */
  fakes: {
    sms: FakeSms | null;
    email: FakeEmail | null;
    travel: FakeTravel | null;
    geocode: FakeGeocode | null;
  };
};

/** The number that the fake provider texts from; from the range kept for fiction. */
const FAKE_NUMBER = '+12025550100';

const held = globalThis as typeof globalThis & { setwellPorts?: Promise<Ports> };

export function getPorts(): Promise<Ports> {
  held.setwellPorts ??= openPorts(env()).catch((error) => {
    held.setwellPorts = undefined;
    throw error;
  });
  return held.setwellPorts;
}

export async function openPorts(settings: Env): Promise<Ports> {
  const [sms, email, travel, geocode] = await Promise.all([
    chooseSms(settings),
    chooseEmail(settings),
    chooseTravel(settings),
    chooseGeocode(settings),
  ]);
  return {
    sms: sms.port,
    email: email.port,
    travel: travel.port,
    geocode: geocode.port,
    fakes: { sms: sms.fake, email: email.fake, travel: travel.fake, geocode: geocode.fake },
  };
}

async function chooseSms({ sms, dataDirectory, publicUrl }: Env) {
  if (sms) return { port: twilioSms(sms), fake: null };
  // Made anew each time, so that nobody outside this process can sign a webhook.
  const account = {
    accountSid: `AC${randomBytes(16).toString('hex')}`,
    authToken: randomBytes(16).toString('hex'),
    number: FAKE_NUMBER,
  };
  const fake = await startFakeSms({
    account,
    file: path.join(/*turbopackIgnore: true*/ dataDirectory, 'fakes', 'sms.jsonl'),
    inboundUrl: `${publicUrl}${apiPaths.smsWebhook()}`,
  });
  const { accountSid, authToken, number } = account;
  return {
    port: twilioSms({ accountSid, authToken, from: number, apiBaseUrl: fake.apiBaseUrl }),
    fake,
  };
}

async function chooseEmail({ smtpUrl, emailFrom, dataDirectory }: Env) {
  if (smtpUrl) return { port: smtpEmail({ smtpUrl, from: emailFrom }), fake: null };
  const fake = await startFakeEmail({
    file: path.join(/*turbopackIgnore: true*/ dataDirectory, 'fakes', 'email.jsonl'),
  });
  return { port: smtpEmail({ smtpUrl: fake.smtpUrl, from: emailFrom }), fake };
}

async function chooseTravel({ travelUrl }: Env) {
  if (travelUrl) return { port: osrmTravel({ baseUrl: travelUrl }), fake: null };
  const fake = await startFakeTravel();
  return { port: osrmTravel({ baseUrl: fake.baseUrl }), fake };
}

async function chooseGeocode({ geocodeUrl, publicUrl }: Env) {
  const userAgent = `Setwell (${publicUrl})`;
  if (geocodeUrl) return { port: nominatimGeocode({ baseUrl: geocodeUrl, userAgent }), fake: null };
  const fake = await startFakeGeocode();
  // The fake is ours alone: nobody has to wait a second for their turn.
  return { port: nominatimGeocode({ baseUrl: fake.baseUrl, userAgent, gapMs: 0 }), fake };
}
