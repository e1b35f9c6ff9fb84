import type { EmailRefusalCode } from '@/server/ports/email/email-port';
import type { SmsRefusalCode } from '@/server/ports/sms/sms-port';

const advice: Record<SmsRefusalCode | EmailRefusalCode, string> = {
  'opted-out':
    'This phone said STOP. Text START from it to the number of the shop, then try again.',
  'bad-number': 'Write the number with its area code, or with + and its country code.',
  'cannot-receive': 'Take a mobile number.',
  busy: 'Wait a minute and try again. Customers’ texts are tried again by themselves.',
  unreachable: 'Check the address of the service and that this machine may reach it.',
  'no-answer': 'Try again. If it stays so, look whether the service has a fault of its own.',
  blocked: 'Ask the provider about the registration of your number; give them the code below.',
  misconfigured:
    'Check SMS_ACCOUNT_SID, SMS_AUTH_TOKEN and SMS_FROM, or the name and password in SMTP_URL.',
  'bad-address': 'Check how the address is written.',
  deferred: 'Try again in some minutes. Customers’ e-mail is tried again by itself.',
};

/** What the owner can do about a test that failed. */
export function testAdvice(code: string): string {
  return Object.hasOwn(advice, code) ? advice[code as keyof typeof advice] : '';
}
