'use client';

import { useState } from 'react';
import { newId } from '@/components/phone/new-id';
import { TakePhoto } from '@/components/photos/take-photo';
import { Button } from '@/components/ui/button';
import { SelectField } from '@/components/ui/select-field';
import { TextField } from '@/components/ui/text-field';
import { TextareaField } from '@/components/ui/textarea-field';
import { type SnagKind, type SnagMender, snagKinds, snagMenders } from '@/lib/contracts/snag-kinds';
import type { StopView } from '@/lib/contracts/stops';
import type { TodayVisit } from '@/lib/contracts/visits';
import { ChoiceRow } from './choice-row';
import { useCrew } from './crew-language';
import { KeepFailed } from './keep-failed';
import { ScreenFrame } from './screen-frame';
import { SnagPhotos } from './snag-photos';
import { stillHere } from './still-here';
import { goToStop } from './stop-place';
import { unitChoices } from './unit-choices';
import { useKeptDraft } from './use-kept-draft';
import { useTell } from './use-tell';

type NewSnagScreenProps = { visit: TodayVisit; stop: StopView; kind: SnagKind };

type SnagDraft = {
  kind: SnagKind;
  roomId: string;
  unitId: string;
  place: string;
  words: string;
  mender: SnagMender;
  dueOn: string;
  photoIds: string[];
};

/** What is not right, or not there: with where it is, who mends it, by when, and photos with marks. */
export function NewSnagScreen({ visit, stop, kind: asked }: NewSnagScreenProps) {
  const crew = useCrew();
  const { words } = crew;
  const { tell, isFailed } = useTell(visit.id);
  const isPart = asked !== 'fault';
  const { draft, change, drop } = useKeptDraft<SnagDraft>(`snag:${visit.id}:${asked}`, {
    kind: asked,
    roomId: visit.rooms[0]?.id ?? '',
    unitId: '',
    place: '',
    words: '',
    // What is short or damaged is made by the bench.
    mender: isPart ? 'bench' : 'crew',
    dueOn: '',
    photoIds: [],
  });
  const [isAskingWords, setIsAskingWords] = useState(false);
  if (!draft) return null;
  const units = unitChoices(stop, draft.roomId, crew);
  const save = async () => {
    if (draft.words.trim() === '') return setIsAskingWords(true);
    const unit = units.find(({ id }) => id === draft.unitId);
    const isKept = await tell({
      what: 'snag',
      id: newId(),
      kind: draft.kind,
      roomId: draft.roomId || null,
      unitId: unit?.id ?? null,
      place: [unit?.words, draft.place.trim()].filter(Boolean).join(', ').slice(0, 80),
      words: draft.words.trim(),
      mender: draft.mender,
      dueOn: draft.dueOn || null,
      photoIds: await stillHere(draft.photoIds),
    });
    if (!isKept) return;
    drop();
    goToStop({ at: 'snags' });
  };
  return (
    <ScreenFrame title={isPart ? words.partShort : words.newSnag} back={{ at: 'snags' }}>
      <ChoiceRow
        legend={words.what}
        choices={snagKinds.map((kind) => ({ value: kind, words: words.snagKinds[kind] }))}
        chosen={draft.kind}
        onChoose={(kind) => change({ kind })}
      />
      <TextareaField
        label={words.words}
        value={draft.words}
        maxLength={600}
        error={isAskingWords && draft.words.trim() === '' ? words.sayWhat : undefined}
        onChange={(event) => change({ words: event.target.value })}
      />
      <div>
        <SnagPhotos photoIds={draft.photoIds} />
        <TakePhoto
          roomId={draft.roomId || null}
          jobId={visit.jobId}
          wallId={null}
          words={words.takePhoto}
          place={draft.words.trim().slice(0, 80) || words.snagKinds[draft.kind]}
          onKept={(photoId) => {
            change({ photoIds: [...draft.photoIds, photoId] });
            goToStop({ at: 'photo', photoId, kind: asked, snagId: '' });
          }}
        />
      </div>
      {visit.rooms.length > 0 ? (
        <SelectField
          label={words.where}
          value={draft.roomId}
          emptyLabel={words.noRoom}
          className="min-h-thumb"
          options={visit.rooms.map(({ id, name }) => ({ value: id, label: name }))}
          onChange={(event) => change({ roomId: event.target.value, unitId: '' })}
        />
      ) : null}
      {units.length > 0 ? (
        <SelectField
          label={words.unit}
          value={draft.unitId}
          emptyLabel="—"
          className="min-h-thumb"
          options={units.map(({ id, words: label }) => ({ value: id, label }))}
          onChange={(event) => change({ unitId: event.target.value })}
        />
      ) : null}
      <TextField
        label={words.place}
        value={draft.place}
        maxLength={60}
        className="min-h-thumb"
        onChange={(event) => change({ place: event.target.value })}
      />
      <ChoiceRow
        legend={words.mender}
        choices={snagMenders.map((mender) => ({ value: mender, words: words.menders[mender] }))}
        chosen={draft.mender}
        onChoose={(mender) => change({ mender })}
      />
      <TextField
        label={words.due}
        type="date"
        value={draft.dueOn}
        className="min-h-thumb"
        onChange={(event) => change({ dueOn: event.target.value })}
      />
      <KeepFailed isFailed={isFailed} />
      <Button size="thumb" onClick={save}>
        {words.save}
      </Button>
    </ScreenFrame>
  );
}
