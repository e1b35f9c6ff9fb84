import type { ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { TitleBlock } from '@/components/ui/title-block';
import { useCrew } from './crew-language';
import { goToStop, type StopPlace } from './stop-place';

type ScreenFrameProps = {
  title: string;
  meta?: ReactNode;
  /** Where "Back" leads; the stop unless said. */
  back?: StopPlace;
  children: ReactNode;
};

/** One thing of a stop on one screen, and the way back under the thumb. */
export function ScreenFrame({ title, meta, back = { at: 'stop' }, children }: ScreenFrameProps) {
  const { words, language } = useCrew();
  return (
    <div lang={language} className="flex flex-1 flex-col gap-5 px-3.5 py-4">
      <TitleBlock level={1} title={title} meta={meta} />
      {children}
      <Button size="thumb" look="plain" className="mt-auto" onClick={() => goToStop(back)}>
        {words.back}
      </Button>
    </div>
  );
}
