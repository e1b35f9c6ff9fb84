'use client';

import { useState } from 'react';
import { newId } from '@/components/phone/new-id';
import type { WallBookView } from '@/lib/contracts/rooms';
import type { Wall } from '@/lib/contracts/wall-book';
import {
  addWallAfter,
  insertBay,
  insertBreast,
  removeWall,
  setCorner,
  setLength,
} from '@/lib/walls-pad/change-walls';
import { cornerSumWords } from '@/lib/walls-pad/close-sketch';
import { entryValue } from '@/lib/walls-pad/entry-value';
import { draftInUnit, type PadDraft } from '@/lib/walls-pad/pad-draft';
import { emptyEntry, entryOfAngle, entryOfLength, isEmptyEntry } from '@/lib/walls-pad/pad-entry';
import type { PadField } from '@/lib/walls-pad/pad-fields';
import { type Chains, GUESSED_MM } from '@/lib/walls-pad/room-shapes';
import { speechIn } from '@/lib/walls-pad/say-length';
import { goTo, placeHref } from './book-place';
import { FieldPad } from './field-pad';
import type { PadHabits } from './pad-habits';
import { PlanPicture } from './plan-picture';
import type { SketchDraft } from './sketch-draft';
import { CornerSheet, WallChangeSheet } from './sketch-sheets';

type SketchWallsProps = {
  view: WallBookView;
  draft: SketchDraft;
  pickedId: string | null;
  keptWallIds: ReadonlySet<string>;
  habits: PadHabits;
  onHabits: (change: Partial<PadHabits>) => void;
  onDraft: (draft: SketchDraft) => void;
  onChains: (chains: Chains, more?: Partial<SketchDraft>) => void;
  onStartOver: (() => void) | null;
};

/** Wall by wall: how long roughly, and how the corner at its left turns. */
export function SketchWalls(props: SketchWallsProps) {
  const { draft, pickedId } = props;
  const walls = draft.chains.flatMap((chain) => chain.walls);
  const wall = walls.find(({ id }) => id === pickedId) ?? walls[0];
  return wall ? <SketchWall key={wall.id} {...props} wall={wall} walls={walls} /> : null;
}

const lengthField: PadField = { name: 'value', label: 'rough length', kind: 'length' };
const angleField: PadField = { name: 'angle', label: 'corner', kind: 'angle' };

function SketchWall(props: SketchWallsProps & { wall: Wall; walls: Wall[] }) {
  const { draft, wall, walls, keptWallIds, habits, onChains } = props;
  const { unit } = habits;
  const [sheet, setSheet] = useState<'corner' | 'change' | null>(null);
  const [isAngle, setIsAngle] = useState(false);
  const [refusal, setRefusal] = useState<string | null>(null);
  const [pad, setPad] = useState<PadDraft>(() => ({
    question: wall.id,
    cornerMethod: 'legs',
    entries: {
      value: draft.typedWallIds.includes(wall.id)
        ? entryOfLength(wall.nominalLengthMm, unit)
        : emptyEntry(unit),
      angle: entryOfAngle(wall.leftCornerDeg ?? 90),
    },
    active: 'value',
  }));
  const speech = speechIn(props.view.rules, unit);
  const close = () => setSheet(null);
  const lengthEntry = pad.entries.value ?? emptyEntry(unit);
  const typedMm = isEmptyEntry(lengthEntry) ? null : entryValue(lengthEntry, 'length').value;
  /** The walls with what stands typed, so that a wall put in beside it costs nobody a second typing. */
  const typed =
    typedMm === null
      ? { chains: draft.chains, typedWallIds: draft.typedWallIds }
      : {
          chains: setLength(draft.chains, wall.id, typedMm),
          typedWallIds: [...new Set([...draft.typedWallIds, wall.id])],
        };

  if (sheet === 'corner') {
    return (
      <CornerSheet
        wall={wall}
        onBack={close}
        onCorner={(deg) => {
          onChains(setCorner(draft.chains, wall.id, deg));
          close();
        }}
        onOther={() => {
          setIsAngle(true);
          setPad({
            ...pad,
            active: 'angle',
            entries: { ...pad.entries, angle: emptyEntry('deg') },
          });
          close();
        }}
      />
    );
  }
  if (sheet === 'change') {
    const pick = (chains: Chains, wallId = wall.id) => {
      onChains(chains, { typedWallIds: typed.typedWallIds });
      close();
      goTo({ at: 'sketch', wallId });
    };
    return (
      <WallChangeSheet
        wall={wall}
        canRemove={walls.length > 1 && !keptWallIds.has(wall.id)}
        onBack={close}
        onStartOver={props.onStartOver}
        onAdd={(cornerDeg) => {
          const id = newId();
          pick(
            addWallAfter(typed.chains, wall.id, { id, cornerDeg, lengthMm: GUESSED_MM.across }),
            id,
          );
        }}
        onBreast={() => pick(insertBreast(typed.chains, wall.id, newId))}
        onBay={() => pick(insertBay(typed.chains, wall.id, newId))}
        onRemove={() =>
          pick(removeWall(typed.chains, wall.id), walls.find(({ id }) => id !== wall.id)?.id)
        }
      />
    );
  }

  const at = walls.findIndex(({ id }) => id === wall.id);
  const goOn = () => {
    const following = walls[at + 1];
    if (following) goTo({ at: 'sketch', wallId: following.id });
  };
  const next = () => {
    const field = isAngle ? angleField : lengthField;
    const entry = pad.entries[field.name] ?? emptyEntry(unit);
    const isUntouched = !isAngle && entry.whole === '' && entry.sixtyFourths === 0 && !entry.feet;
    const isLast = at === walls.length - 1;
    if (isUntouched) {
      if (isLast) props.onDraft({ ...draft, step: 'site' });
      return goOn();
    }
    const { value, problems } = entryValue(entry, field.kind);
    if (value === null) return setRefusal(problems[0]?.message ?? 'This cannot be a length.');
    if (isAngle) {
      onChains(setCorner(draft.chains, wall.id, value));
      setIsAngle(false);
      return setPad({ ...pad, active: 'value' });
    }
    const typedWallIds = [...new Set([...draft.typedWallIds, wall.id])];
    const chains = setLength(draft.chains, wall.id, value);
    onChains(chains, { typedWallIds, ...(isLast ? { step: 'site' } : {}) });
    goOn();
  };
  const room = { ...props.view.wallBook.room, chains: draft.chains };
  const sum = cornerSumWords(draft.chains);
  return (
    <FieldPad
      picture={
        <PlanPicture
          book={{ ...props.view.wallBook, room }}
          speech={speech}
          currentWallIds={[wall.id]}
          currentCornerId={isAngle ? wall.id : null}
          hrefOfWall={(wallId) => placeHref({ at: 'sketch', wallId })}
          isSketch
        />
      }
      title={isAngle ? `Corner at the left of wall ${wall.name}` : `Wall ${wall.name}, roughly`}
      detail={
        isAngle
          ? 'the angle inside the room, in degrees'
          : unit === 'in'
            ? 'to the nearest few inches will do'
            : 'to the nearest 100 mm will do'
      }
      toGo={`${at + 1} of ${walls.length} walls`}
      fields={[isAngle ? angleField : lengthField]}
      draft={pad}
      onDraft={(next) => {
        setRefusal(null);
        setPad(next);
      }}
      unit={unit}
      onUnit={() => {
        const other = unit === 'in' ? 'mm' : 'in';
        props.onHabits({ unit: other });
        setPad(draftInUnit(pad, [lengthField], other));
      }}
      stepMm={speech.stepMm}
      says={
        refusal
          ? { kind: 'refused', words: refusal }
          : sum
            ? { kind: 'close', words: sum }
            : { kind: 'why', words: 'Touch a wall to go to it. Exact lengths come later, by tape.' }
      }
      actions={[
        {
          key: 'corner',
          label: 'corner at its left',
          value: wall.leftCornerDeg === null ? 'free end' : `${Math.round(wall.leftCornerDeg)}°`,
          onPress: () => wall.leftCornerDeg !== null && setSheet('corner'),
        },
        { key: 'change', label: 'add or take away', onPress: () => setSheet('change') },
        {
          key: 'done',
          label: 'all drawn ›',
          onPress: () => props.onDraft({ ...draft, step: 'site' }),
        },
      ]}
      nextWords="next ›"
      onNext={next}
      isBusy={false}
      onAgain={null}
    />
  );
}
