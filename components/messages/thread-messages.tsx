import { Verdict } from '@/components/ui/verdict';
import type { ThreadView } from '@/lib/contracts/messages';
import { messageStates, occasionOf, reasonOf } from './message-state';

/** Theirs on the left, ours on the right, in the order of time; what was withdrawn is one quiet line. */
export function ThreadMessages({ messages }: Pick<ThreadView, 'messages'>) {
  if (messages.length === 0) {
    return <p className="py-3 text-graphite">Nothing yet.</p>;
  }
  return (
    <ol className="flex flex-col gap-3 py-3">
      {messages.map((message) => (
        <li
          key={message.id}
          className={`max-w-[85%] ${message.state === 'received' ? 'self-start' : 'self-end'}`}
        >
          <ThreadMessage message={message} />
        </li>
      ))}
    </ol>
  );
}

function ThreadMessage({ message }: { message: ThreadView['messages'][number] }) {
  const { state, channel, body, reason, writtenBy, dueAtWords, segments } = message;
  const { words, kind } = messageStates[state];
  const head = [
    occasionOf(message),
    channel === 'sms' ? 'text' : 'e-mail',
    writtenBy,
    dueAtWords,
    segments > 1 ? `${segments} messages` : '',
  ];
  return (
    <>
      <p className="text-note text-graphite">{head.filter(Boolean).join(' · ')}</p>
      {body && state !== 'withdrawn' ? (
        <p
          className={`mt-0.5 rounded border px-3 py-2 break-words whitespace-pre-line ${
            state === 'received' ? 'border-graphite bg-sheet' : 'border-rule bg-tint'
          }`}
        >
          {body}
        </p>
      ) : null}
      <p className="mt-0.5 text-note">
        <Verdict kind={kind}>{words}</Verdict>
        {reason ? <span className="text-graphite"> {reasonOf(message)}</span> : null}
      </p>
    </>
  );
}
