import { emailHtml } from '@/lib/messages/email-html';
import { plainSms } from '@/lib/messages/plain-sms';
import { buttonWords } from '@/lib/messages/render-message';
import type { Context } from '@/server/base/context';
import type { Claimed } from './claim-due';
import type { Composed } from './compose';
import type { Recipient } from './recipient';

/** The occasion of what somebody of the shop writes themselves. */
export const byHand = 'by-hand';

/** A text in the letters that SMS carries cheaply, an e-mail as it was written. */
export function composeByHand(ctx: Context, message: Claimed, recipient: Recipient): Composed {
  const { text = '', subject = ctx.shop.name } = message.cause;
  if (message.channel === 'sms') return { is: 'sms', body: plainSms(text) };
  const { language } = recipient;
  return {
    is: 'email',
    email: {
      subject,
      text,
      html: emailHtml({ text, language, buttonWords: buttonWords[language] }),
      ...(ctx.shop.email ? { replyTo: ctx.shop.email } : {}),
    },
  };
}
