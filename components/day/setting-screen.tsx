'use client';

import { DrawingView } from '@/components/drawing/drawing-view';
import { InFractions } from '@/components/fit/in-fractions';
import { TitleBlock } from '@/components/ui/title-block';
import type { StopView } from '@/lib/contracts/stops';
import { drawElevation } from '@/lib/drawing/elevation';
import { drawPlan } from '@/lib/drawing/plan';
import { wallsOf } from '@/lib/sheet/room-names';
import { drawingIn } from '@/lib/words/drawn-words';
import { useCrew } from './crew-language';
import { ScreenFrame } from './screen-frame';
import { SettingCautions } from './setting-cautions';
import { SettingLines } from './setting-lines';
import { SettingOrder } from './setting-order';

/** The released fit for who sets by it: levels, order, drawings, what is cut on site, cautions. */
export function SettingScreen({ stop, roomId }: { stop: StopView; roomId: string }) {
  const crew = useCrew();
  const { words } = crew;
  const sheet = stop.sheets.find(({ wallBook }) => wallBook.room.id === roomId);
  if (!sheet) return <ScreenFrame title={words.setting}>{words.notKept}</ScreenFrame>;
  const { wallBook, runs, fit, rules } = sheet;
  const walls = wallsOf(wallBook.room).filter(({ wall }) =>
    runs.some(({ wallId }) => wallId === wall.id),
  );
  const plan = drawingIn(drawPlan({ wallBook, runs, fit, rules }), crew);
  return (
    <ScreenFrame
      title={`${words.setting}: ${sheet.roomName}`}
      meta={words.revision(sheet.release.revision)}
    >
      {sheet.supersededBy.length > 0 || sheet.newerRevision ? (
        <p role="alert" className="border-l-4 border-chalk bg-tint px-3 py-2 font-bold">
          {words.superseded}
        </p>
      ) : null}
      <SettingLines sheet={sheet} part="levels" />
      <SettingOrder runs={runs} />
      <section>
        <TitleBlock title={sheet.roomName} meta={words.drawnAs} />
        <DrawingView drawing={plan} title={sheet.roomName} />
      </section>
      {walls.map(({ wall }) => {
        const drawing = drawElevation({ wallBook, runs, fit, rules, wallId: wall.id });
        const ofWall = runs.filter(({ wallId }) => wallId === wall.id);
        return (
          <section key={wall.id}>
            <TitleBlock
              title={
                <InFractions
                  words={`${words.wall(wall.name)}: ${ofWall.map(({ name }) => name).join(', ')}`}
                />
              }
            />
            {drawing ? (
              <DrawingView drawing={drawingIn(drawing, crew)} title={words.wall(wall.name)} />
            ) : null}
          </section>
        );
      })}
      <SettingLines sheet={sheet} part="cuts" />
      <SettingCautions sheet={sheet} />
    </ScreenFrame>
  );
}
