'use client';

import { Signature } from '@/components/sign-off/signature';
import { Verdict } from '@/components/ui/verdict';
import type { SignOffView } from '@/lib/contracts/sign-offs';
import { useCrew } from './crew-language';

/** What was signed, as it stands: the words, the list of that moment, the signature. */
export function SignedView({ signOff }: { signOff: SignOffView }) {
  const { words } = useCrew();
  return (
    <section className="flex flex-col gap-3">
      <Verdict kind="confirmed">{words.signedBy(signOff.name, signOff.signedWords)}</Verdict>
      <p lang={signOff.language}>{signOff.statement}</p>
      <p className="font-bold">{words.openHere(signOff.snags.length)}</p>
      <ul className="list-disc pl-5">
        {signOff.snags.map((snag) => (
          <li key={snag.id}>{[snag.place, snag.words].filter(Boolean).join(': ')}</li>
        ))}
      </ul>
      <Signature strokes={signOff.strokes} label={words.signOff} />
      <p className="text-graphite">{words.signedSafe}</p>
    </section>
  );
}
