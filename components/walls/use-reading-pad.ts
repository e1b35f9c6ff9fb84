import { useState } from 'react';
import { keepDraft } from '@/components/phone/draft-store';
import { newId } from '@/components/phone/new-id';
import { usePersonId } from '@/components/phone/phone-person';
import { keepWork } from '@/components/phone/queue-store';
import type { Reading } from '@/lib/contracts/readings';
import type { WallBookView } from '@/lib/contracts/rooms';
import { entriesOfReading } from '@/lib/walls-pad/ask-of-reading';
import { type BuiltReading, buildReading } from '@/lib/walls-pad/build-reading';
import { freshDraft, nextField, type PadDraft } from '@/lib/walls-pad/pad-draft';
import { isEmptyEntry } from '@/lib/walls-pad/pad-entry';
import { type CornerMethod, padFields } from '@/lib/walls-pad/pad-fields';
import { type ToolUse, toolInHand } from '@/lib/walls-pad/pad-tools';
import { piecesSoFar } from '@/lib/walls-pad/pieces-so-far';
import { placeFields } from '@/lib/walls-pad/place-fields';
import { sameStart } from '@/lib/walls-pad/same-start';
import { speechIn } from '@/lib/walls-pad/say-length';
import { draftKey } from './draft-keys';
import { type PadHabits, setUpKey } from './pad-habits';
import type { PadQuestion } from './pad-question';
import type { PadSays } from './pad-says';
import type { PadJudge } from './use-plan';

export type ReadingPadInput = {
  question: PadQuestion;
  view: WallBookView;
  judge: PadJudge;
  habits: PadHabits;
  /** Half typed before the page was closed. */
  keptDraft: PadDraft | null;
  /** It is on the phone's disk. */
  onKept: (reading: Reading, isAgain: boolean) => void;
};

/** The state of one question: what is typed, what it means, and keeping it. */
export function useReadingPad(input: ReadingPadInput) {
  const { question, view, judge, habits, keptDraft, onKept } = input;
  const personId = usePersonId();
  const { wallBook, rules, runs } = view;
  const roomId = wallBook.room.id;
  const [draft, setDraft] = useState(() => startOf(question, habits, keptDraft));
  const [refusal, setRefusal] = useState<string | null>(null);
  const [isBusy, setIsBusy] = useState(false);

  const speech = speechIn(rules, habits.unit);
  const { ask, isFree } = question;
  const fields = [
    ...(isFree ? placeFields(ask) : []),
    ...padFields(ask, draft.cornerMethod, draft.entries),
  ];
  const use: ToolUse = ask.kind === 'corner' && draft.cornerMethod === 'angle' ? 'angle' : ask.kind;
  const tool = toolInHand(view.tools, use, habits.toolIds[use]);
  const group = 'setUpGroup' in ask ? setUpKey(roomId, ask.setUpGroup) : null;
  const setUp = group === null ? null : (habits.setUps[group] ?? null);

  const build = (id: string, takenAt: string): BuiltReading =>
    buildReading({
      ask,
      fields,
      entries: draft.entries,
      common: {
        id,
        roomId,
        toolId: tool?.id ?? '',
        takenAt,
        unit: habits.unit,
        touches: habits.touches,
        ...(question.corrects ? { replaces: question.corrects.id } : {}),
      },
      choices: {
        setUpId: setUpOf(question.corrects)?.setUpId ?? setUp?.setUpId ?? '',
        setUpKind: setUpOf(question.corrects)?.setUpKind ?? setUp?.setUpKind ?? 'plumb-level',
        studAt: question.corrects?.kind === 'stud' ? question.corrects.at : habits.studAt,
        doorwayName:
          question.corrects?.kind === 'doorway' ? question.corrects.name : habits.doorwayName,
      },
    });

  const says = (): PadSays => {
    if (refusal) return { kind: 'refused', words: refusal };
    const { reading } = build('typing', '');
    const verdict = reading
      ? judge.verdictOf(reading, { book: wallBook, runs, rules: { ...rules, ...speech } })
      : null;
    const soFar = reading ? null : piecesSoFar(ask, fields, draft.entries, speech);
    return verdict ?? { kind: 'why', words: soFar ?? question.why };
  };

  const change = (next: PadDraft) => {
    setRefusal(null);
    setDraft(next);
    keepDraft(draftKey(roomId), next);
  };

  const refuse = (words: string, field: string | null) => {
    setRefusal(words);
    if (field !== null) setDraft({ ...draft, active: field });
  };

  const keep = async (isAgain: boolean) => {
    const { reading, problems } = build(newId(), new Date().toISOString());
    if (!reading) return refuse(problems[0].message, problems[0].field);
    const impossible = judge.refusalOf(reading, { book: wallBook, runs, rules });
    if (impossible) return refuse(impossible.message, null);
    if (!tool) return refuse('The shop has no tools yet. Ask the office to add one.', null);
    setIsBusy(true);
    try {
      await keepWork(personId, [{ kind: 'reading', reading }]);
    } catch {
      setRefusal(
        'This phone could not keep it. Nothing was lost yet: write it down, free some space, try again.',
      );
      setIsBusy(false);
      return;
    }
    setIsBusy(false);
    if (isAgain) change(againOf(question, habits, draft));
    onKept(reading, isAgain);
  };

  const next = () => {
    if (isBusy) return;
    const active = fields.find(({ name }) => name === draft.active);
    const field = nextField(fields, draft);
    if (active && !active.isOptional && isUntyped(draft)) setRefusal(`Type the ${active.label}.`);
    else if (field === null) void keep(false);
    else change({ ...draft, active: field });
  };

  // What is read afresh, or corrected, must not begin with what stood there.
  const isAfresh = question.corrects !== null || question.key.startsWith('again:');
  const isMain = fields.at(-1)?.name === draft.active && !fields.at(-1)?.isOptional;
  const start =
    isAfresh || !isMain
      ? null
      : sameStart(ask, { book: wallBook, setUpId: setUp?.setUpId ?? null, unit: habits.unit });

  return {
    draft,
    start,
    change,
    fields,
    tool,
    use,
    speech,
    group,
    setUp,
    says: says(),
    isBusy,
    next,
    keep,
    personId,
  };
}

/** A set-up is part of a gap, a drop or a rise; a correction stays in its own. */
function setUpOf(reading: Reading | null) {
  if (reading?.kind === 'face') return reading;
  if (reading?.kind === 'floor' || reading?.kind === 'ceiling') {
    return { setUpId: reading.setUpId, setUpKind: 'laser-plane' as const };
  }
  return null;
}

function startOf(question: PadQuestion, habits: PadHabits, kept: PadDraft | null): PadDraft {
  if (kept?.question === question.key) return kept;
  const { corrects } = question;
  const method = methodOf(corrects) ?? habits.cornerMethod;
  const fresh = blank(question, habits, method);
  if (!corrects) return fresh;
  const entries = { ...fresh.entries, ...entriesOfReading(corrects, habits.unit) };
  const names = padFields(question.ask, method).map(({ name }) => name);
  return { ...fresh, entries, active: names.at(-1) ?? fresh.active };
}

/** The same question once more: places stay, figures go. */
function againOf(question: PadQuestion, habits: PadHabits, draft: PadDraft): PadDraft {
  const fresh = blank(question, habits, draft.cornerMethod);
  const places = placeFields(question.ask).map(({ name }) => name);
  const kept = Object.entries(draft.entries).filter(([name]) => places.includes(name));
  const isPlaced = question.isFree && kept.length > 0;
  const entries = { ...fresh.entries, ...Object.fromEntries(kept) };
  return isPlaced ? { ...fresh, entries } : fresh;
}

function blank(question: PadQuestion, habits: PadHabits, method: CornerMethod): PadDraft {
  const { ask, isFree, key } = question;
  const fields = [...(isFree ? placeFields(ask) : []), ...padFields(ask, method)];
  return freshDraft(key, ask, fields, habits.unit, method);
}

function methodOf(reading: Reading | null): CornerMethod | null {
  return reading?.kind === 'corner' ? reading.by.method : null;
}

function isUntyped({ entries, active }: PadDraft): boolean {
  const entry = entries[active];
  return !entry || isEmptyEntry(entry);
}
