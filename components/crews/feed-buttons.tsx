'use client';

import { useState } from 'react';
import { sayProblem } from '@/components/shell/say-problem';
import { Button } from '@/components/ui/button';
import { showToast } from '@/components/ui/toast-store';
import type { FeedView, MakeFeedInput } from '@/lib/contracts/feeds';
import { makeFeed, revokeFeed, useRefetchCrews } from './crews-query';

type FeedButtonsProps = {
  /** "Crew North". */
  name: string;
  of: MakeFeedInput;
  feeds: readonly FeedView[];
};

/** The addresses at which calendars read these visits: made, copied, taken back. */
export function FeedButtons({ name, of, feeds }: FeedButtonsProps) {
  const refetch = useRefetchCrews();
  const [isBusy, setIsBusy] = useState(false);

  async function run(work: () => Promise<void>) {
    setIsBusy(true);
    try {
      await work();
    } catch (caught) {
      sayProblem(caught);
    } finally {
      setIsBusy(false);
      await refetch();
    }
  }
  const copy = async (address: string) => {
    await navigator.clipboard.writeText(address);
    showToast({ text: `Copied. Paste it in a calendar under "subscribe" or "from the internet".` });
  };

  return (
    <div className={feeds.length > 0 ? 'flex w-full flex-col' : undefined}>
      {feeds.map((feed) => (
        <div key={feed.id} className="flex flex-wrap items-center gap-x-3 pl-3.5 text-note">
          <code className="max-w-full break-all">{feed.address}</code>
          <span className="text-graphite">
            made {feed.madeWords}, {feed.readWords ? `last read ${feed.readWords}` : 'not read yet'}
          </span>
          <Button look="plain" onClick={() => run(() => copy(feed.address))}>
            Copy
          </Button>
          <Button
            look="plain"
            className="text-chalk"
            aria-label={`Take back the calendar address of ${name}`}
            onClick={() =>
              run(async () => {
                await revokeFeed(feed.id);
                showToast({
                  text: `Taken back: the calendars that read ${name} there get nothing more.`,
                });
              })
            }
          >
            Take it back
          </Button>
        </div>
      ))}
      <div>
        <Button
          look="plain"
          busyText={isBusy ? 'Working…' : undefined}
          aria-label={`Calendar address for ${name}`}
          onClick={() => run(async () => copyIfAllowed((await makeFeed(of)).address, copy))}
        >
          {feeds.length > 0 ? 'One more calendar address' : 'Calendar address'}
        </Button>
      </div>
    </div>
  );
}

/** The address stands on the screen in any case; a browser may refuse to copy. */
async function copyIfAllowed(address: string, copy: (address: string) => Promise<void>) {
  try {
    await copy(address);
  } catch {
    showToast({ text: 'The address is made. Copy it from its line.' });
  }
}
