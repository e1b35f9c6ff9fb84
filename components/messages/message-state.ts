import type { VerdictKind } from '@/components/ui/verdict';
import type { MessageView } from '@/lib/contracts/messages';
import { occasionWords } from '@/lib/messages/occasions';

/** How a message stands, in words, with its glyph and colour. */
export const messageStates: Record<MessageView['state'], { words: string; kind: VerdictKind }> = {
  waiting: { words: 'waits for its time', kind: 'waiting' },
  sending: { words: 'being sent', kind: 'waiting' },
  sent: { words: 'sent', kind: 'confirmed' },
  delivered: { words: 'delivered', kind: 'confirmed' },
  refused: { words: 'not delivered: call them', kind: 'problem' },
  withdrawn: { words: 'withdrawn', kind: 'off' },
  received: { words: 'from the customer', kind: 'waiting' },
};

/** Why it stands so, without what its state says already. */
export const reasonOf = ({ reason }: Pick<MessageView, 'reason'>) =>
  reason.replace(/^Not delivered: call them\. /, '');

const words: Record<string, string> = {
  ...occasionWords,
  reply: 'Reply',
  'by-hand': 'Written by hand',
};

export const occasionOf = ({ occasion }: Pick<MessageView, 'occasion'>) =>
  words[occasion] ?? occasion;
