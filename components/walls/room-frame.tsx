import type { ReactNode } from 'react';
import { TitleBlock } from '@/components/ui/title-block';

type RoomFrameProps = {
  picture?: ReactNode;
  title: ReactNode;
  meta?: ReactNode;
  children: ReactNode;
};

/** A screen of the wall book that is not the pad: the plan on top, then what there is to read. */
export function RoomFrame({ picture, title, meta, children }: RoomFrameProps) {
  return (
    <div className="flex flex-1 flex-col">
      {picture ? <div className="relative h-48 border-b border-rule">{picture}</div> : null}
      <div className="flex flex-col gap-4 px-3.5 py-4">
        <TitleBlock level={1} title={title} meta={meta} />
        {children}
      </div>
    </div>
  );
}
