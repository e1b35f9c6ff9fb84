'use client';

import { type ReactNode, useState } from 'react';
import { useHolder } from '@/components/phone/phone-person';
import { TakePhoto } from '@/components/photos/take-photo';
import { Button } from '@/components/ui/button';
import { TextareaField } from '@/components/ui/textarea-field';
import { TitleBlock } from '@/components/ui/title-block';
import { Verdict } from '@/components/ui/verdict';
import type { SnagView } from '@/lib/contracts/snags';
import { useCrew } from './crew-language';
import { KeepFailed } from './keep-failed';
import { ScreenFrame } from './screen-frame';
import { snagFacts } from './snag-facts';
import { SnagPhotos } from './snag-photos';
import { stillHere } from './still-here';
import { goToStop } from './stop-place';
import { useKeptDraft } from './use-kept-draft';
import { useTell } from './use-tell';
import { foundIn } from './visit-times';

type SnagScreenProps = {
  /** Not there when it was never kept here, or is closed and gone from the list. */
  snag: SnagView | undefined;
  /** From which it is closed. */
  visitId: string;
  /** Where it is, when that is not plain from the screen before. */
  lead?: ReactNode;
};

/** One snag: what it is, what the bench says, and how it is closed. */
export function SnagScreen({ snag, visitId, lead }: SnagScreenProps) {
  const crew = useCrew();
  const { words } = crew;
  const { zone } = useHolder();
  if (!snag) {
    return (
      <ScreenFrame title={words.snags} back={{ at: 'snags' }}>
        {words.notKept}
      </ScreenFrame>
    );
  }
  return (
    <ScreenFrame title={snag.words} back={{ at: 'snags' }}>
      {lead}
      <div>
        <p className="text-lead">{snagFacts(snag, crew)}</p>
        <p className="text-graphite">{foundIn(snag, crew, zone)}</p>
        <SnagPhotos photoIds={snag.photoIds} />
        {snag.benchSays ? (
          <p className="border-l-4 border-blueprint bg-tint px-3 py-2">
            {words.benchSays(snag.benchSays)}
            {snag.benchReadyOn ? `, ${words.dueOn(snag.benchReadyOn)}` : ''}
          </p>
        ) : null}
      </div>
      {snag.closedAt ? (
        <section>
          <TitleBlock
            title={<Verdict kind="confirmed">{words.closed}</Verdict>}
            meta={snag.closedBy}
          />
          <p className="py-2">{snag.closedWords}</p>
          <SnagPhotos photoIds={snag.closedPhotoIds} />
        </section>
      ) : (
        <Closing visitId={visitId} snag={snag} />
      )}
    </ScreenFrame>
  );
}

function Closing({ visitId, snag }: { visitId: string; snag: SnagView }) {
  const { words } = useCrew();
  const { id: snagId, roomId, jobId } = snag;
  const { tell, isFailed } = useTell(visitId);
  const [isAsking, setIsAsking] = useState(false);
  const { draft, change, drop } = useKeptDraft<{ words: string; photoIds: string[] }>(
    `close:${snagId}`,
    { words: '', photoIds: [] },
  );
  if (!draft) return null;
  const close = async () => {
    const photoIds = await stillHere(draft.photoIds);
    const said = draft.words.trim();
    if (said === '' && photoIds.length === 0) return setIsAsking(true);
    if (!(await tell({ what: 'close-snag', snagId, words: said, photoIds }))) return;
    drop();
    goToStop({ at: 'snags' });
  };
  return (
    <section className="flex flex-col gap-3">
      <TitleBlock title={words.closeIt} />
      <TextareaField
        label={words.closeHow}
        value={draft.words}
        maxLength={400}
        error={isAsking && draft.words.trim() === '' ? words.closeNeeds : undefined}
        onChange={(event) => change({ words: event.target.value })}
      />
      <SnagPhotos photoIds={draft.photoIds} />
      <TakePhoto
        roomId={roomId}
        jobId={jobId}
        wallId={null}
        words={words.takePhoto}
        place={words.closed}
        onKept={(photoId) => {
          change({ photoIds: [...draft.photoIds, photoId] });
          goToStop({ at: 'photo', photoId, kind: '', snagId });
        }}
      />
      <KeepFailed isFailed={isFailed} />
      <Button size="thumb" onClick={close}>
        {words.closeIt}
      </Button>
    </section>
  );
}
