'use client';

import { useLive } from '@/components/phone/use-live';
import { PhotoImage } from '@/components/photos/photo-image';
import { readPhoto } from '@/components/photos/photo-store';
import { useBlobUrl } from '@/components/photos/use-blob-url';
import { apiPaths } from '@/lib/paths';
import { useCrew } from './crew-language';

/** Photos of a snag: those on this phone from its store, the others from the office. */
export function SnagPhotos({ photoIds }: { photoIds: readonly string[] }) {
  const { words } = useCrew();
  if (photoIds.length === 0) return null;
  return (
    <ul className="flex gap-2 overflow-x-auto py-2" aria-label={words.photos}>
      {photoIds.map((photoId) => (
        <li
          key={photoId}
          className="size-28 shrink-0 overflow-hidden rounded border border-rule bg-tint"
        >
          <OnePhoto photoId={photoId} />
        </li>
      ))}
    </ul>
  );
}

function OnePhoto({ photoId }: { photoId: string }) {
  const { words } = useCrew();
  const live = useLive(`photo:${photoId}`, () => readPhoto(photoId));
  const here = live.state === 'here' ? live.value : null;
  const url = useBlobUrl(here?.marked ?? here?.clean ?? null);
  if (live.state === 'reading') return null;
  if (here) return url ? <PhotoImage src={url} words={here.place} /> : null;
  return <PhotoImage src={apiPaths.file(photoId)} words={words.photos} />;
}
