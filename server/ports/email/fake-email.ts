/**
 * A mail server on loopback: takes everything, reads it as a mail program would, keeps it in a file. With
 * faults set it refuses, dawdles, breaks off or greylists, as mail servers do.
 */
import { setTimeout as wait } from 'node:timers/promises';
import { SMTPServer, type SMTPServerDataStream, type SMTPServerSession } from 'smtp-server';
import { openAppendLog } from '@/server/ports/fakes/append-log';
import { faultSwitch } from '@/server/ports/fakes/fault-switch';
import { LOOPBACK, listenOnLoopback, trackSockets } from '@/server/ports/fakes/listening';
import { type FakeMail, readMail } from './fake-mail';

export type EmailFault =
  /** Refused when the recipient is named, with this SMTP code: 550, 552, 421 … */
  | { kind: 'refuse'; code: number }
  /** Taken, but answered only after this long. */
  | { kind: 'slow'; delayMs: number }
  /** The connection breaks before the mail was taken, or after it. */
  | { kind: 'drop-before' }
  | { kind: 'drop-after' }
  /** 451 to the first try of each sender and recipient, then taken. */
  | { kind: 'greylist' };

export type FakeEmail = Awaited<ReturnType<typeof startFakeEmail>>;

export async function startFakeEmail(options: { file: string; port?: number }) {
  const log = await openAppendLog<FakeMail>(options.file);
  const mails: FakeMail[] = [...log.entries];
  const faults = faultSwitch<EmailFault>();
  const triedBefore = new Set<string>();
  /** The fault of the mail under way, by session. */
  const faultOf = new Map<string, EmailFault | null>();

  async function whyRefused(session: SMTPServerSession, to: string): Promise<Error | null> {
    const fault = faults.take(to);
    faultOf.set(session.id, fault);
    if (fault?.kind === 'refuse') return smtpError(fault.code, 'Mailbox unavailable');
    if (fault?.kind !== 'greylist') return null;
    const sender = session.envelope.mailFrom ? session.envelope.mailFrom.address : '';
    const pair = `${sender} ${to}`;
    if (triedBefore.has(pair)) return null;
    triedBefore.add(pair);
    return smtpError(451, '4.7.1 Greylisted, try again later');
  }

  async function take(session: SMTPServerSession, stream: SMTPServerDataStream): Promise<void> {
    const fault = faultOf.get(session.id);
    faultOf.delete(session.id);
    if (fault?.kind === 'drop-before') sockets.drop(session.remotePort);
    const mail = await readMail(stream, session);
    if (fault?.kind === 'drop-before') return;
    mails.push(mail);
    await log.append(mail);
    if (fault?.kind === 'drop-after') sockets.drop(session.remotePort);
    if (fault?.kind === 'slow') await wait(fault.delayMs);
  }

  const smtp = new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    disableReverseLookup: true,
    logger: false,
    onRcptTo(address, session, callback) {
      whyRefused(session, address.address).then(callback, callback);
    },
    onData(stream, session, callback) {
      take(session, stream).then(() => callback(), callback);
    },
  });
  // A client that breaks off is an ordinary day for a mail server.
  smtp.on('error', () => {});
  const sockets = trackSockets(smtp.server);
  const port = await listenOnLoopback(smtp.server, options.port ?? 0);

  return {
    smtpUrl: `smtp://${LOOPBACK}:${port}`,
    faults,
    /** What an inbox holds, oldest first. */
    mailsFor: (address: string): FakeMail[] =>
      mails.filter((mail) => mail.recipients.includes(address.toLowerCase())),
    /** Every address that was written to, the one with the newest mail first. */
    addresses: (): string[] => [
      ...new Set([...mails].reverse().flatMap((mail) => mail.recipients)),
    ],
    async stop(): Promise<void> {
      sockets.dropAll();
      await new Promise<void>((resolve) => smtp.close(() => resolve()));
    },
  };
}

function smtpError(responseCode: number, message: string): Error {
  return Object.assign(new Error(message), { responseCode });
}
