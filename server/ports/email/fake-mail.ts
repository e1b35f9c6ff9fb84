import { randomUUID } from 'node:crypto';
import { type AddressObject, simpleParser } from 'mailparser';
import type { SMTPServerDataStream, SMTPServerSession } from 'smtp-server';

/** A mail as its reader's program shows it. */
export type FakeMail = {
  id: string;
  /** ISO, UTC. */
  receivedAt: string;
  /** Of the envelope, lower case: who gets it, whatever its headers say. */
  recipients: string[];
  from: string;
  to: string;
  replyTo: string;
  subject: string;
  text: string;
  html: string;
  messageId: string;
  headers: Record<string, string>;
  attachments: { filename: string; contentType: string; text: string | null; base64: string }[];
};

export async function readMail(
  stream: SMTPServerDataStream,
  session: SMTPServerSession,
): Promise<FakeMail> {
  const mail = await simpleParser(stream);
  return {
    id: randomUUID(),
    receivedAt: new Date().toISOString(),
    recipients: session.envelope.rcptTo.map(({ address }) => address.toLowerCase()),
    from: mail.from?.text ?? '',
    to: addressText(mail.to),
    replyTo: mail.replyTo?.text ?? '',
    subject: mail.subject ?? '',
    text: mail.text ?? '',
    html: mail.html || '',
    messageId: mail.messageId ?? '',
    headers: Object.fromEntries(mail.headerLines.map(({ key, line }) => [key, headerValue(line)])),
    attachments: mail.attachments.map(({ filename, contentType, content }) => ({
      filename: filename ?? '',
      contentType,
      text:
        contentType.startsWith('text/') || contentType === 'application/ics'
          ? content.toString('utf8')
          : null,
      base64: content.toString('base64'),
    })),
  };
}

function addressText(to: AddressObject | AddressObject[] | undefined): string {
  return [to ?? []]
    .flat()
    .map(({ text }) => text)
    .join(', ');
}

function headerValue(line: string): string {
  return line.slice(line.indexOf(':') + 1).trim();
}
