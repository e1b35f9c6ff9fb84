'use client';

import { useState } from 'react';
import { switchShop } from '@/components/door/auth-requests';
import { askServer, problemOf } from '@/components/shell/ask-server';
import { Button } from '@/components/ui/button';
import { TitleBlock } from '@/components/ui/title-block';
import { showToast } from '@/components/ui/toast-store';
import { apiPaths, paths } from '@/lib/paths';

type SamplePartProps = { isSample: boolean; sampleShopId: string | null };

/** A shop to play with beside one's own, made and removed whole. */
export function SamplePart({ isSample, sampleShopId }: SamplePartProps) {
  const [isBusy, setIsBusy] = useState(false);
  const carryOut = async (work: () => Promise<void>) => {
    setIsBusy(true);
    try {
      await work();
      window.location.assign(paths.signIn());
    } catch (caught) {
      setIsBusy(false);
      showToast({ text: problemOf(caught).title, isProblem: true });
    }
  };
  const start = () =>
    carryOut(async () => {
      const made = await askServer<{ shopId: string }>(apiPaths.sampleShop(), {
        method: 'POST',
        body: {},
      });
      await switchShop(made.shopId);
    });
  const remove = () =>
    carryOut(async () => {
      await askServer(apiPaths.sampleShop(), { method: 'DELETE' });
    });
  const hasOne = isSample || sampleShopId !== null;
  return (
    <section>
      <TitleBlock title="A sample to play with" />
      <p className="max-w-prose py-3">
        {hasOne
          ? 'Your sample shop has some forty jobs at every stage. Nobody is told anything from it. Removed, it is gone with all that was done in it; your own shop is not touched.'
          : 'A second shop beside yours, with invented people and some forty jobs at every stage. Try everything there: nobody is told, and it can be removed whole.'}
      </p>
      <div className="flex gap-3">
        {hasOne ? (
          <Button look="line" onClick={remove} busyText={isBusy ? 'Removing…' : undefined}>
            Remove the sample
          </Button>
        ) : (
          <Button look="line" onClick={start} busyText={isBusy ? 'Making…' : undefined}>
            Make a sample shop
          </Button>
        )}
      </div>
    </section>
  );
}
