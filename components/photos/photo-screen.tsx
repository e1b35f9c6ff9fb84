'use client';

import { useState } from 'react';
import { newId } from '@/components/phone/new-id';
import { useCrewLanguage } from '@/components/phone/spoken-language';
import { useLive } from '@/components/phone/use-live';
import { useTyping } from '@/components/phone/use-typing';
import { Button } from '@/components/ui/button';
import { TitleBlock } from '@/components/ui/title-block';
import { ChoiceSheet } from '@/components/walls/choice-sheet';
import type { KeptPhoto } from '@/lib/photos/kept-photo';
import { captionOf, markOf, type PhotoMark, type PhotoPoint } from '@/lib/photos/photo-marks';
import { photoWords } from '@/lib/words/photo-words';
import { markedPhoto } from './marked-photo';
import { PhotoPicture } from './photo-picture';
import { dropPhoto, finishPhoto, keepMarks, readPhoto } from './photo-store';
import { useBlobUrl } from './use-blob-url';

type PhotoScreenProps = {
  photoId: string;
  /** Readings that may be written on it: what was read, and the figure. */
  figures: { id: string; what: string; value: string }[];
  onDone: () => void;
};

/** A photo on this phone: circles, arrows and figures are put on it by touch until it has gone out. */
export function PhotoScreen({ photoId, figures, onDone }: PhotoScreenProps) {
  const words = photoWords[useCrewLanguage()];
  const live = useLive(`photo:${photoId}`, () => readPhoto(photoId));
  if (live.state === 'reading') return null;
  if (live.state === 'failed' || !live.value) {
    return (
      <section className="flex flex-col gap-4 p-3.5">
        <p>{words.gone}</p>
        <Button size="thumb" onClick={onDone}>
          {words.back}
        </Button>
      </section>
    );
  }
  return <Marking photo={live.value} figures={figures} onDone={onDone} />;
}

type MarkTool = { kind: 'circle' } | { kind: 'arrow' } | { kind: 'words'; words: string };

function Marking({
  photo,
  figures,
  onDone,
}: Omit<PhotoScreenProps, 'photoId'> & { photo: KeptPhoto }) {
  const { id, place, marks, parked } = photo;
  const words = photoWords[useCrewLanguage()];
  const isSent = photo.sentAt !== null;
  const url = useBlobUrl(photo.clean ?? photo.marked);
  const [tool, setTool] = useState<MarkTool>({ kind: 'circle' });
  const [isChoosing, setIsChoosing] = useState(false);
  const [isBusy, setIsBusy] = useState(false);
  useTyping(!isSent && !photo.isDone);

  if (isChoosing) {
    return (
      <ChoiceSheet
        title={words.whichFigure}
        choices={figures.map((figure) => ({
          value: figure.id,
          words: figure.value,
          hint: figure.what,
        }))}
        onChoose={(chosen) => {
          const figure = figures.find((each) => each.id === chosen);
          if (figure) setTool({ kind: 'words', words: figure.value });
          setIsChoosing(false);
        }}
        onBack={() => setIsChoosing(false)}
      >
        {words.thenTouch}
      </ChoiceSheet>
    );
  }
  const put = (from: PhotoPoint, to: PhotoPoint) => {
    const mark: PhotoMark =
      tool.kind === 'words'
        ? { kind: 'words', at: to, words: tool.words }
        : markOf(tool.kind, { from, to }, photo);
    void keepMarks(id, [...marks, { ...mark, id: newId() }]);
  };
  const finish = async () => {
    setIsBusy(true);
    // What cannot be drawn now is drawn when it is sent, or shown as not taken.
    await finishPhoto(id, await markedPhoto(photo));
    onDone();
  };
  return (
    <section className="flex flex-1 flex-col gap-3 px-3.5 py-4">
      <TitleBlock level={1} title={place} meta={isSent ? words.withOffice : words.savedHere} />
      {url ? (
        <PhotoPicture
          url={url}
          size={photo}
          caption={captionOf(place, marks)}
          // The marks of a photo that went out are drawn into it.
          marks={isSent ? [] : marks}
          onMark={isSent ? null : put}
        />
      ) : null}
      {parked ? (
        <p role="alert" className="border-l-4 border-chalk bg-tint px-3 py-2">
          {words.notTaken(parked)}
        </p>
      ) : null}
      {isSent ? (
        <Button size="thumb" className="mt-auto" onClick={onDone}>
          {words.back}
        </Button>
      ) : (
        <>
          <p className="text-note text-graphite">{words.howTo[tool.kind]}</p>
          <div className={`grid gap-2 ${figures.length > 0 ? 'grid-cols-3' : 'grid-cols-2'}`}>
            <ToolButton isOn={tool.kind === 'circle'} onPress={() => setTool({ kind: 'circle' })}>
              {words.tools.circle}
            </ToolButton>
            <ToolButton isOn={tool.kind === 'arrow'} onPress={() => setTool({ kind: 'arrow' })}>
              {words.tools.arrow}
            </ToolButton>
            {figures.length > 0 ? (
              <ToolButton isOn={tool.kind === 'words'} onPress={() => setIsChoosing(true)}>
                {tool.kind === 'words' ? tool.words : words.tools.words}
              </ToolButton>
            ) : null}
          </div>
          <div className="mt-auto flex flex-col gap-2">
            <Button size="thumb" onClick={finish} busyText={isBusy ? words.drawingIn : undefined}>
              {words.done}
            </Button>
            <div className="grid grid-cols-2 gap-2">
              <Button
                size="thumb"
                look="plain"
                disabled={marks.length === 0}
                onClick={() => void keepMarks(id, marks.slice(0, -1))}
              >
                {words.takeOff}
              </Button>
              <Button
                size="thumb"
                look="chalk"
                onClick={async () => {
                  await dropPhoto(id);
                  onDone();
                }}
              >
                {words.throwAway}
              </Button>
            </div>
          </div>
        </>
      )}
    </section>
  );
}

type ToolButtonProps = { isOn: boolean; onPress: () => void; children: string };

function ToolButton({ isOn, onPress, children }: ToolButtonProps) {
  return (
    <button
      type="button"
      aria-pressed={isOn}
      onClick={onPress}
      className={`min-h-thumb touch-manipulation truncate rounded border px-2 ${
        isOn ? 'border-2 border-pine bg-tint font-bold' : 'border-graphite active:bg-tint'
      }`}
    >
      {children}
    </button>
  );
}
