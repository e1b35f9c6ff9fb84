'use client';

import { useState } from 'react';
import { readCode } from '@/components/phone/kept-store';
import { localToday } from '@/components/phone/local-today';
import { useLive } from '@/components/phone/use-live';
import { Button } from '@/components/ui/button';
import { useCrew } from './crew-language';
import { KeepFailed } from './keep-failed';
import { useTell } from './use-tell';

/** The code of the door: hidden until it is asked for, and each look at it is told to the office. */
export function AccessCode({ visitId }: { visitId: string }) {
  const { words } = useCrew();
  const { tell, isFailed } = useTell(visitId);
  const [isShown, setIsShown] = useState(false);
  const live = useLive(`code:${visitId}`, () => readCode(visitId, localToday()));
  const code = live.state === 'here' ? live.value : null;
  const show = async () => {
    if (await tell({ what: 'code-seen' })) setIsShown(true);
  };
  return (
    <div className="border-t border-rule py-2">
      <p className="text-note text-graphite">{words.accessCode}</p>
      {code === null ? (
        <p>{words.codeNotHere}</p>
      ) : isShown ? (
        <div className="flex items-center justify-between gap-4">
          <p className="text-title font-bold tracking-wider">{code}</p>
          <Button look="plain" size="thumb" className="w-auto!" onClick={() => setIsShown(false)}>
            {words.hideCode}
          </Button>
        </div>
      ) : (
        <Button look="line" size="thumb" className="my-1" onClick={show}>
          {words.showCode}
        </Button>
      )}
      <p className="text-note text-graphite">{words.codeOnDay}</p>
      <KeepFailed isFailed={isFailed} />
    </div>
  );
}
