'use client';

import { useState } from 'react';
import { dropDraft, keepDraft } from '@/components/phone/draft-store';
import { newId } from '@/components/phone/new-id';
import { usePersonId } from '@/components/phone/phone-person';
import { keepWork } from '@/components/phone/queue-store';
import { useTyping } from '@/components/phone/use-typing';
import type { WallBookView } from '@/lib/contracts/rooms';
import { standingReadings } from '@/lib/measure/standing-readings';
import { wallIdsOf } from '@/lib/measure/wall-ids';
import { chainsOfShape } from '@/lib/walls-pad/room-shapes';
import { goTo } from './book-place';
import { sketchKey } from './draft-keys';
import type { PadHabits } from './pad-habits';
import { ShapePick } from './shape-pick';
import { SiteState } from './site-state';
import { roomOfSketch, type SketchDraft, startSketch, withChains } from './sketch-draft';
import { SketchWalls } from './sketch-walls';

type SketchScreenProps = {
  view: WallBookView;
  keptSketch: SketchDraft | null;
  /** Picked on the plan. */
  wallId: string | null;
  habits: PadHabits;
  onHabits: (change: Partial<PadHabits>) => void;
};

/** Draws the room by touch: its shape, then rough lengths and corners wall by wall, then how the site stands. */
export function SketchScreen({ view, keptSketch, wallId, habits, onHabits }: SketchScreenProps) {
  const { room, readings } = view.wallBook;
  const personId = usePersonId();
  const [draft, setDraft] = useState(keptSketch ?? startSketch(room));
  useTyping(true);
  const [refusal, setRefusal] = useState<string | null>(null);
  const keptWallIds = new Set(standingReadings(readings).flatMap(wallIdsOf));
  const change = (next: SketchDraft) => {
    setDraft(next);
    keepDraft(sketchKey(room.id), next);
  };

  if (draft.step === 'shape') {
    return (
      <ShapePick
        onPick={(shape) => {
          const chains = chainsOfShape(shape, newId);
          change({ ...draft, chains, typedWallIds: [], step: 'walls' });
          goTo({ at: 'sketch' });
        }}
      />
    );
  }
  if (draft.step === 'walls') {
    return (
      <SketchWalls
        {...{ draft, habits, onHabits, keptWallIds, view }}
        pickedId={wallId}
        onDraft={change}
        onChains={(chains, more) => change(withChains({ ...draft, ...more }, chains, keptWallIds))}
        onStartOver={
          keptWallIds.size > 0 ? null : () => change({ ...startSketch({ ...room, chains: [] }) })
        }
      />
    );
  }
  const finish = async () => {
    const drawn = roomOfSketch(room.id, draft);
    try {
      await keepWork(personId, [{ kind: 'room', jobId: view.jobId, room: drawn }]);
    } catch {
      setRefusal('This phone could not keep the drawing. Free some space and try again.');
      return;
    }
    dropDraft(sketchKey(room.id));
    goTo({ at: 'next' });
  };
  return (
    <SiteState
      draft={draft}
      unit={habits.unit}
      region={view.rules.region}
      refusal={refusal}
      onDraft={change}
      onDone={finish}
      onBack={() => change({ ...draft, step: 'walls' })}
    />
  );
}
