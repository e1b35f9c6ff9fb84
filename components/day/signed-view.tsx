'use client';

import { Verdict } from '@/components/ui/verdict';
import type { SignOffView } from '@/lib/contracts/sign-offs';
import { strokePath } from '@/lib/signing/stroke-path';
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
      <Signature signOff={signOff} label={words.signOff} />
      <p className="text-graphite">{words.signedSafe}</p>
    </section>
  );
}

export function Signature({
  signOff,
  label,
}: {
  signOff: Pick<SignOffView, 'strokes'>;
  label: string;
}) {
  return (
    <svg
      viewBox="0 0 600 260"
      role="img"
      aria-label={label}
      className="w-full max-w-md border-b border-ink"
    >
      <path
        d={strokePath(signOff.strokes)}
        fill="none"
        stroke="currentColor"
        strokeWidth={4}
        strokeLinecap="round"
        strokeLinejoin="round"
      />
    </svg>
  );
}
