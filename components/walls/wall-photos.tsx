import { PhotoStrip } from '@/components/photos/photo-strip';
import { TakePhoto } from '@/components/photos/take-photo';
import { TitleBlock } from '@/components/ui/title-block';
import { goTo, placeHref } from './book-place';

type WallPhotosProps = {
  roomId: string;
  /** Null: of the room as a whole. */
  wallId: string | null;
  /** "Wall B". */
  place: string;
};

/** Photos of a wall, and the way to take one and mark it. */
export function WallPhotos({ roomId, wallId, place }: WallPhotosProps) {
  const photoPlace = (photoId: string) => ({ at: 'photo', photoId, wallId: wallId ?? '' }) as const;
  return (
    <section>
      <TitleBlock title="Photos" meta="kept here at once, sent later" />
      <PhotoStrip
        roomId={roomId}
        wallId={wallId}
        hrefOf={(photoId) => placeHref(photoPlace(photoId))}
      />
      <TakePhoto
        roomId={roomId}
        wallId={wallId}
        place={place}
        onKept={(photoId) => goTo(photoPlace(photoId))}
      />
    </section>
  );
}
