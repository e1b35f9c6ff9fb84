'use client';

import { useRouter } from 'next/navigation';
import { usePageKeys } from '@/components/shell/page-keys';
import { Button } from '@/components/ui/button';
import { FormError } from '@/components/ui/form-error';
import { LinkButton } from '@/components/ui/link-button';
import { Verdict } from '@/components/ui/verdict';
import type { SheetView } from '@/lib/contracts/rooms';
import { useTakeUp } from './use-take-up';

/** Over the sheet on screen, never on paper: back to the fit, print, take it up. */
export function SheetBar({
  release,
  newerRevision,
  fitHref,
  mayTakeUp,
}: Pick<SheetView, 'release' | 'newerRevision'> & { fitHref: string; mayTakeUp: boolean }) {
  const router = useRouter();
  const { takeUp, isBusy, problem } = useTakeUp();
  usePageKeys('This sheet', [
    { keys: 'p', words: 'print it', run: () => window.print() },
    { keys: 'f', words: 'back to the fit', run: () => router.push(fitHref) },
  ]);
  return (
    <div className="mb-4 print:hidden">
      <div className="flex flex-wrap items-center gap-2">
        <h1 className="mr-4 text-title font-bold">Shop sheet, revision {release.revision}</h1>
        <Button look="line" keyName="P" onClick={() => window.print()}>
          Print
        </Button>
        <LinkButton look="plain" href={fitHref}>
          To the fit
        </LinkButton>
        {release.takenUpWords ? (
          <Verdict kind="confirmed">taken up: {release.takenUpWords}</Verdict>
        ) : mayTakeUp && !newerRevision ? (
          <Button
            className="ml-auto"
            busyText={isBusy ? 'Taking it up…' : undefined}
            onClick={() => void takeUp(release.id)}
          >
            Take it up at the bench
          </Button>
        ) : null}
      </div>
      <FormError problem={problem} />
    </div>
  );
}
