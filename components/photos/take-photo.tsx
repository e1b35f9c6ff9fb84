'use client';

import { type ChangeEvent, useState } from 'react';
import { newId } from '@/components/phone/new-id';
import { usePersonId } from '@/components/phone/phone-person';
import { buttonLook } from '@/components/ui/button-look';
import { keepPhoto } from './photo-store';
import { scaledPhoto } from './scaled-photo';

type TakePhotoProps = {
  roomId: string | null;
  /** Needed where no room is drawn. */
  jobId?: string;
  wallId: string | null;
  /** Where it is taken: "Wall B". */
  place: string;
  /** In the reader's language; English unless said. */
  words?: TakePhotoWords;
  /** It is on the phone's disk, without marks yet. */
  onKept: (photoId: string) => void;
};

export type TakePhotoWords = Record<
  'take' | 'choose' | 'keeping' | 'cannotOpen' | 'cannotKeep',
  string
>;

const english: TakePhotoWords = {
  take: 'Take a photo',
  choose: 'Choose a photo',
  keeping: 'Keeping it…',
  cannotOpen: 'This phone cannot open that picture. Take a photo instead.',
  cannotKeep: 'This phone could not keep the photo. Free some space and try again.',
};

/** Takes a photo with the phone's own camera, or one that was taken before, and keeps it at once. */
export function TakePhoto({
  roomId,
  jobId,
  wallId,
  place,
  words = english,
  onKept,
}: TakePhotoProps) {
  const personId = usePersonId();
  const [isBusy, setIsBusy] = useState(false);
  const [problem, setProblem] = useState<string | null>(null);

  const take = async (event: ChangeEvent<HTMLInputElement>) => {
    const [file] = event.target.files ?? [];
    event.target.value = '';
    if (!file || isBusy) return;
    setIsBusy(true);
    setProblem(null);
    try {
      const scaled = await scaledPhoto(file);
      if (!scaled) return setProblem(words.cannotOpen);
      const id = newId();
      await keepPhoto({
        ...scaled,
        id,
        personId,
        roomId,
        ...(jobId === undefined ? {} : { jobId }),
        wallId,
        place,
        takenAt: new Date().toISOString(),
        marks: [],
        marked: null,
        isDone: false,
        sentAt: null,
        parked: null,
      });
      onKept(id);
    } catch {
      setProblem(words.cannotKeep);
    } finally {
      setIsBusy(false);
    }
  };

  return (
    <div className="flex flex-col gap-2 py-2">
      <div className="grid grid-cols-2 gap-2">
        <PhotoInput words={isBusy ? words.keeping : words.take} onTake={take} isCamera />
        <PhotoInput words={words.choose} onTake={take} />
      </div>
      {problem ? (
        <p role="alert" className="border-l-4 border-chalk bg-tint px-3 py-2">
          {problem}
        </p>
      ) : null}
    </div>
  );
}

type PhotoInputProps = {
  words: string;
  isCamera?: boolean;
  onTake: (event: ChangeEvent<HTMLInputElement>) => void;
};

function PhotoInput({ words, isCamera = false, onTake }: PhotoInputProps) {
  return (
    <label
      className={`${buttonLook('line', 'thumb')} touch-manipulation has-focus-visible:outline-2 has-focus-visible:outline-offset-2`}
    >
      {words}
      <input
        type="file"
        accept="image/*"
        capture={isCamera ? 'environment' : undefined}
        onChange={onTake}
        className="sr-only"
      />
    </label>
  );
}
