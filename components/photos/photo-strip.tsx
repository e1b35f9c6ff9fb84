'use client';

import { useEffect, useState } from 'react';
import { getJson } from '@/components/phone/get-json';
import { useLive } from '@/components/phone/use-live';
import type { PhotoRow } from '@/lib/contracts/files';
import { apiPaths } from '@/lib/paths';
import type { KeptPhoto } from '@/lib/photos/kept-photo';
import { captionOf } from '@/lib/photos/photo-marks';
import { PhotoImage } from './photo-image';
import { readPhotosOfRoom } from './photo-store';
import { useBlobUrl } from './use-blob-url';

type PhotoStripProps = {
  roomId: string;
  /** Only of this wall; null: of the whole room. */
  wallId: string | null;
  /** Where a photo of this phone is marked. */
  hrefOf: (photoId: string) => string;
};

const frame = 'block size-24 shrink-0 overflow-hidden rounded border border-rule bg-tint';

/** The photos of a room or wall, side by side: those on this phone, then what others took. */
export function PhotoStrip({ roomId, wallId, hrefOf }: PhotoStripProps) {
  const live = useLive(`photos:${roomId}`, () => readPhotosOfRoom(roomId));
  const rows = useOfficePhotos(roomId);
  const isShown = (photo: { wallId: string | null }) => wallId === null || photo.wallId === wallId;
  const here = live.state === 'here' ? live.value : [];
  const hereIds = new Set(here.map(({ id }) => id));
  const there = rows.filter((row) => isShown(row) && !hereIds.has(row.id));
  const shown = here.filter(isShown);
  if (shown.length + there.length === 0) return null;
  return (
    <ul className="flex gap-2 overflow-x-auto py-2" aria-label="Photos">
      {shown.map((photo) => (
        <li key={photo.id}>
          <a href={hrefOf(photo.id)} className={frame}>
            <HerePicture photo={photo} />
          </a>
        </li>
      ))}
      {there.map((row) => (
        <li key={row.id}>
          <a href={apiPaths.file(row.id)} target="_blank" rel="noreferrer" className={frame}>
            <PhotoImage src={apiPaths.file(row.id)} words={`${row.caption}, ${row.takenBy}`} />
          </a>
        </li>
      ))}
    </ul>
  );
}

function HerePicture({ photo }: { photo: KeptPhoto }) {
  const url = useBlobUrl(photo.marked ?? photo.clean);
  const words = captionOf(photo.place, photo.marks);
  return url ? <PhotoImage src={url} words={words} /> : <span className="sr-only">{words}</span>;
}

/** What the office has of this room; nothing where there is no signal. */
function useOfficePhotos(roomId: string): PhotoRow[] {
  const [rows, setRows] = useState<PhotoRow[]>([]);
  useEffect(() => {
    let isShown = true;
    void getJson<PhotoRow[]>(apiPaths.photosOfRoom(roomId)).then((found) => {
      if (isShown && found) setRows(found);
    });
    return () => {
      isShown = false;
    };
  }, [roomId]);
  return rows;
}
