import Link from 'next/link';
import { Button } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { TextField } from '@/components/ui/text-field';
import { TitleBlock } from '@/components/ui/title-block';
import type { DemoPhone } from '@/lib/contracts/demo';
import { phoneWords } from '@/lib/messages/phone-number';
import { paths } from '@/lib/paths';
import { LinkedText } from './linked-text';

/** The customer's phone and inbox, as the fakes keep them. */
export function CustomerPhone({ phone }: { phone: DemoPhone }) {
  if (phone.numbers.length === 0 && phone.addresses.length === 0) {
    return (
      <EmptyState title="Nothing has arrived yet">
        Book a visit in the diary: the text and the e-mail to the customer land here.
      </EmptyState>
    );
  }
  return (
    <div className="flex flex-col gap-4">
      <nav aria-label="Phones and inboxes" className="flex gap-2 overflow-x-auto pb-2">
        {[
          ...phone.numbers.map((number) => ({ number })),
          ...phone.addresses.map((address) => ({ address })),
        ].map((to) => {
          const name = 'number' in to ? to.number : to.address;
          const isShown = name === phone.number || name === phone.address;
          return (
            <Link
              key={name}
              href={paths.demoPhoneOf(to)}
              aria-current={isShown ? 'page' : undefined}
              className="shrink-0 rounded border border-rule px-3 py-2 text-note aria-[current]:border-pine aria-[current]:font-bold"
            >
              {'number' in to ? phoneWords(to.number, 'US') : name}
            </Link>
          );
        })}
      </nav>
      {phone.numbers.length === 0 ? (
        <p className="border-l-4 border-ochre bg-tint px-3 py-2">
          No text yet: it is night at the site, and texts wait for the morning. The e-mail is here.
        </p>
      ) : null}
      {phone.number ? <Texts phone={phone} number={phone.number} /> : <Mails phone={phone} />}
    </div>
  );
}

function Texts({ phone, number }: { phone: DemoPhone; number: string }) {
  return (
    <>
      <TitleBlock title="Texts" meta={phoneWords(number, 'US')} />
      <ol className="flex flex-col gap-3">
        {phone.texts.map((text) => (
          <li
            key={text.id}
            className={`max-w-[88%] rounded border border-rule px-3 py-2 ${
              text.isFromCustomer ? 'self-end bg-tint' : 'self-start bg-paper'
            }`}
          >
            <LinkedText text={text.body} />
          </li>
        ))}
      </ol>
      <form method="post" action={paths.demoReply()} className="flex flex-col gap-3">
        <input type="hidden" name="number" value={number} />
        <TextField label="Text back" name="body" placeholder="YES" autoComplete="off" required />
        <Button type="submit" size="thumb">
          Send
        </Button>
      </form>
    </>
  );
}

function Mails({ phone }: { phone: DemoPhone }) {
  return (
    <>
      <TitleBlock title="Inbox" meta={phone.address} />
      {phone.mails.toReversed().map((mail) => (
        <article key={mail.id} className="border-b border-rule pb-3">
          <h3 className="font-bold">{mail.subject}</h3>
          <LinkedText text={mail.text} />
          {mail.attachments.length > 0 ? (
            <p className="text-note text-graphite">with {mail.attachments.join(', ')}</p>
          ) : null}
        </article>
      ))}
    </>
  );
}
