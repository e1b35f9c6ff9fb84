import { Signature } from '@/components/sign-off/signature';
import { LinkButton } from '@/components/ui/link-button';
import { Verdict } from '@/components/ui/verdict';
import type { SignOffView } from '@/lib/contracts/sign-offs';
import { apiPaths } from '@/lib/paths';
import { crewEn } from '@/lib/words/crew-en';

/** What the customer signed, each with the snags of that moment, its copy, and whether it was touched since. */
export function SignOffList({ signOffs }: { signOffs: SignOffView[] }) {
  return (
    <ul className="divide-y divide-rule">
      {signOffs.map((signOff) => (
        <li key={signOff.id} className="flex flex-col gap-2 py-3">
          <p className="font-medium">
            {signOff.name}, {signOff.signedWords}
          </p>
          {signOff.isUntouched ? (
            <Verdict kind="confirmed">unchanged since it was signed</Verdict>
          ) : (
            <Verdict kind="problem">this record was changed after it was signed</Verdict>
          )}
          <Signature strokes={signOff.strokes} label={`Signature of ${signOff.name}`} />
          <p className="text-note text-graphite">taken by {signOff.takenBy}</p>
          <p>{crewEn.openHere(signOff.snags.length)}</p>
          <ul className="list-disc pl-5">
            {signOff.snags.map((snag) => (
              <li key={snag.id}>{[snag.place, snag.words].filter(Boolean).join(': ')}</li>
            ))}
          </ul>
          <div>
            <LinkButton look="line" href={apiPaths.signOffCopy(signOff.id)} target="_blank">
              Copy as PDF
            </LinkButton>
          </div>
        </li>
      ))}
    </ul>
  );
}
