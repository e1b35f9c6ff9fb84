'use client';

import { useState } from 'react';
import { keepDraft } from '@/components/phone/draft-store';
import { newId } from '@/components/phone/new-id';
import { usePersonId } from '@/components/phone/phone-person';
import { keepWork } from '@/components/phone/queue-store';
import { type FeatureKind, featureKind, type ReadingOf } from '@/lib/contracts/readings';
import type { WallBookView } from '@/lib/contracts/rooms';
import { entriesOfReading } from '@/lib/walls-pad/ask-of-reading';
import { buildFeature, featureFields, opens } from '@/lib/walls-pad/feature-fields';
import { draftInUnit, nextField, type PadDraft } from '@/lib/walls-pad/pad-draft';
import { emptyEntry } from '@/lib/walls-pad/pad-entry';
import { toolInHand } from '@/lib/walls-pad/pad-tools';
import { speechIn } from '@/lib/walls-pad/say-length';
import { refusalOf } from '@/lib/walls-pad/verdict-of';
import { featureName } from '@/lib/words/feature-words';
import { ChoiceSheet } from './choice-sheet';
import { draftKey } from './draft-keys';
import { featureChoices, swingChoices } from './feature-words';
import { FieldPad } from './field-pad';
import type { PadHabits } from './pad-habits';
import { PadSheets } from './pad-sheets';
import { WallElevation } from './wall-elevation';

type FeaturePadProps = {
  wallId: string;
  wallName: string;
  /** Asked for by the plan; null: the measurer picks. */
  askedKind: FeatureKind | null;
  corrects: ReadingOf<'feature'> | null;
  keptDraft: PadDraft | null;
  view: WallBookView;
  habits: PadHabits;
  onHabits: (change: Partial<PadHabits>) => void;
  onKept: () => void;
  onBack: () => void;
};

/** Something on the wall: what it is, where from the left corner and the floor, how large. */
export function FeaturePad(props: FeaturePadProps) {
  const { corrects, view, habits, wallId } = props;
  const personId = usePersonId();
  const prefix = `feature/${wallId}/${corrects?.id ?? ''}`;
  const kept = keptOf(prefix, props.keptDraft);
  const [kind, setKind] = useState(kept?.kind ?? corrects?.feature ?? props.askedKind);
  const [swing, setSwing] = useState(kept?.swing ?? corrects?.swing ?? null);
  const [sheet, setSheet] = useState<'tool' | 'touches' | null>(null);
  const [refusal, setRefusal] = useState<string | null>(null);
  const [draft, setDraft] = useState(() => kept?.draft ?? startOf(corrects, habits));
  const tool = toolInHand(view.tools, 'feature', habits.toolIds.feature);

  if (kind === null) {
    return (
      <ChoiceSheet
        title={`What is on wall ${props.wallName}?`}
        choices={featureChoices(view.rules.region)}
        onChoose={setKind}
        onBack={props.onBack}
      />
    );
  }
  if (opens(kind) && swing === null) {
    return (
      <ChoiceSheet
        title="Which way does it open?"
        choices={swingChoices}
        onChoose={setSwing}
        onBack={() => (props.askedKind ? props.onBack() : setKind(null))}
      >
        Seen from inside the room.
      </ChoiceSheet>
    );
  }
  if (sheet) {
    return (
      <PadSheets
        {...{ sheet, habits }}
        tools={view.tools}
        region={view.rules.region}
        toolId={tool?.id}
        use="feature"
        questionTitle=""
        onHabits={props.onHabits}
        onSkip={() => setSheet(null)}
        onClose={() => setSheet(null)}
      />
    );
  }

  const build = (id: string, takenAt: string) =>
    buildFeature({
      entries: draft.entries,
      common: {
        id,
        roomId: view.wallBook.room.id,
        toolId: tool?.id ?? '',
        takenAt,
        unit: habits.unit,
        touches: habits.touches,
        wallId,
        feature: kind,
        swing: swing ?? 'none',
        ...(corrects ? { replaces: corrects.id } : {}),
      },
    });
  const change = (next: PadDraft) => {
    setRefusal(null);
    setDraft(next);
    const question = `${prefix}/${kind}/${swing ?? 'none'}`;
    keepDraft(draftKey(view.wallBook.room.id), { ...next, question });
  };
  const keep = async () => {
    const { reading, problem } = build(newId(), new Date().toISOString());
    const impossible = reading
      ? refusalOf(reading, { book: view.wallBook, runs: view.runs, rules: view.rules })
      : problem;
    if (!reading || impossible || !tool) {
      setRefusal(impossible?.message ?? 'The shop has no tools yet. Ask the office to add one.');
      if (problem) setDraft({ ...draft, active: problem.field });
      return;
    }
    try {
      await keepWork(personId, [{ kind: 'reading', reading }]);
      props.onKept();
    } catch {
      setRefusal('This phone could not keep it. Free some space and try again.');
    }
  };
  const next = () => {
    const field = nextField(featureFields, draft);
    if (field === null) void keep();
    else change({ ...draft, active: field });
  };
  const changeUnit = () => {
    const unit = habits.unit === 'in' ? 'mm' : 'in';
    props.onHabits({ unit });
    change(draftInUnit(draft, featureFields, unit));
  };
  const typed = build('typing', '').reading;
  return (
    <FieldPad
      picture={
        <WallElevation
          book={view.wallBook}
          wallId={wallId}
          region={view.rules.region}
          typed={typed?.kind === 'feature' ? typed : null}
        />
      }
      title={`${featureName(kind, view.rules.region)} on wall ${props.wallName}`}
      detail="from the left corner · up from the floor · out of the wall"
      toGo=""
      fields={featureFields}
      draft={draft}
      onDraft={change}
      unit={habits.unit}
      onUnit={changeUnit}
      stepMm={speechIn(view.rules, habits.unit).stepMm}
      says={
        refusal
          ? { kind: 'refused', words: refusal }
          : { kind: 'why', words: 'Cabinets, fillers and doors are held against it.' }
      }
      actions={[
        { key: 'back', label: '‹ back', onPress: props.onBack },
        {
          key: 'tool',
          label: 'tool',
          value: tool?.name ?? 'none',
          onPress: () => setSheet('tool'),
        },
      ]}
      nextWords="next ›"
      onNext={next}
      isBusy={false}
      onAgain={null}
    />
  );
}

/** Half typed before the page was closed: what it was and which way it opens stand in the draft's name. */
function keptOf(prefix: string, draft: PadDraft | null) {
  if (!draft?.question.startsWith(`${prefix}/`)) return null;
  const [kindName, swingName] = draft.question.slice(prefix.length + 1).split('/');
  const kind = featureKind.options.find((value) => value === kindName);
  const swing = swingChoices.find(({ value }) => value === swingName)?.value;
  return kind && swing ? { kind, swing, draft } : null;
}

function startOf(corrects: ReadingOf<'feature'> | null, { unit }: PadHabits): PadDraft {
  const blank = Object.fromEntries(featureFields.map(({ name }) => [name, emptyEntry(unit)]));
  const entries = corrects ? entriesOfReading(corrects, unit) : {};
  return {
    question: 'feature',
    cornerMethod: 'legs',
    entries: { ...blank, ...entries },
    active: 'x0',
  };
}
