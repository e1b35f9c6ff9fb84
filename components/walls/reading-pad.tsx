'use client';

import { type ReactNode, useState } from 'react';
import { howToWords } from '@/lib/walls-pad/ask-words';
import { draftInUnit, freshDraft } from '@/lib/walls-pad/pad-draft';
import { padFields } from '@/lib/walls-pad/pad-fields';
import { placeFields } from '@/lib/walls-pad/place-fields';
import { FieldPad } from './field-pad';
import { keepSkip } from './keep-note';
import { PadSheets, SetUpSheet } from './lazy-screens';
import { padActions } from './pad-actions';
import type { PadHabits } from './pad-habits';
import type { PadSheet } from './pad-sheets';
import { RuleSheet } from './rule-sheet';
import { type ReadingPadInput, useReadingPad } from './use-reading-pad';

type ReadingPadProps = ReadingPadInput & {
  picture: ReactNode;
  /** "5 of 23 to go". */
  toGo: string;
  /** "Wall A, length at the floor: 142 1/8\"". */
  lastKept: string | undefined;
  onHabits: (change: Partial<PadHabits>) => void;
  onSkipped: (reason: string) => void;
  onBack: () => void;
};

/** Asks for one reading and keeps it on the phone before anything else happens. */
export function ReadingPad(props: ReadingPadProps) {
  const { question, view, habits, onHabits } = props;
  const { ask, slot, corrects, isFree } = question;
  const pad = useReadingPad(props);
  const [sheet, setSheet] = useState<PadSheet | null>(null);
  const close = () => setSheet(null);

  const needsSetUp = pad.group !== null && !pad.setUp && !corrects;
  if ((needsSetUp || sheet === 'set-up') && 'setUpGroup' in ask && pad.group !== null) {
    const group = pad.group;
    return (
      <SetUpSheet
        ask={ask}
        title={question.title}
        onBack={needsSetUp ? props.onBack : close}
        onSetUp={(setUp) => {
          onHabits({ setUps: { ...habits.setUps, [group]: setUp } });
          close();
        }}
      />
    );
  }
  if (sheet === 'rule' && 'by' in pad.says && pad.says.by) {
    return <RuleSheet by={pad.says.by} onBack={close} />;
  }
  if (sheet !== null && sheet !== 'set-up' && sheet !== 'rule') {
    return (
      <PadSheets
        {...{ sheet, habits, onHabits }}
        tools={view.tools}
        region={view.rules.region}
        toolId={pad.tool?.id}
        use={pad.use}
        questionTitle={question.title}
        onClose={close}
        onSkip={async (reason) => {
          if (slot === null || !pad.tool) return;
          const roomId = view.wallBook.room.id;
          const { personId } = pad;
          await keepSkip({ personId, roomId, toolId: pad.tool.id, habits, reason, slot });
          close();
          props.onSkipped(reason);
        }}
      />
    );
  }

  const changeUnit = () => {
    const unit = habits.unit === 'in' ? 'mm' : 'in';
    onHabits({ unit });
    pad.change(draftInUnit(pad.draft, pad.fields, unit));
  };
  const changeMethod = () => {
    const cornerMethod = pad.draft.cornerMethod === 'legs' ? 'angle' : 'legs';
    onHabits({ cornerMethod });
    const fields = [...(isFree ? placeFields(ask) : []), ...padFields(ask, cornerMethod)];
    pad.change(freshDraft(question.key, ask, fields, habits.unit, cornerMethod));
  };
  const howTo = howToWords(ask, view.wallBook.room, pad.speech, pad.draft.cornerMethod);
  return (
    <FieldPad
      picture={props.picture}
      title={question.title}
      detail={isFree ? question.why : howTo}
      toGo={corrects ? 'correcting' : props.toGo}
      fields={pad.fields}
      draft={pad.draft}
      onDraft={pad.change}
      unit={habits.unit}
      onUnit={changeUnit}
      stepMm={pad.speech.stepMm}
      says={pad.says}
      onRule={() => setSheet('rule')}
      otherWay={
        ask.kind === 'corner'
          ? {
              words: pad.draft.cornerMethod === 'legs' ? 'by angle' : 'by legs',
              onPress: changeMethod,
            }
          : undefined
      }
      actions={padActions({
        ask,
        habits,
        toolName: pad.tool?.name ?? 'none',
        setUp: pad.setUp,
        canSkip: slot !== null,
        region: view.rules.region,
        onBack: props.onBack,
        onSheet: setSheet,
      })}
      lastKept={corrects ? undefined : props.lastKept}
      start={pad.start}
      goesOn={habits.goesOn && !corrects}
      nextWords="next ›"
      onNext={pad.next}
      isBusy={pad.isBusy}
      onAgain={corrects ? null : () => void pad.keep(true)}
    />
  );
}
