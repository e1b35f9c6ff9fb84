import type { PhotoRow } from '@/lib/contracts/files';
import type { RoomRow } from '@/lib/contracts/jobs';
import { apiPaths } from '@/lib/paths';
import { PhotoImage } from './photo-image';

type JobPhotosProps = { photos: PhotoRow[]; rooms: Pick<RoomRow, 'id' | 'name'>[] };

/** What was photographed on site, room by room; each opens in full, its words under it. */
export function JobPhotos({ photos, rooms }: JobPhotosProps) {
  const taken = rooms.flatMap((room) => {
    const ofRoom = photos.filter(({ roomId }) => roomId === room.id);
    return ofRoom.length > 0 ? [{ ...room, photos: ofRoom }] : [];
  });
  return taken.map((room) => (
    <div key={room.id} className="py-2">
      <h3 className="font-bold">{room.name}</h3>
      <ul className="flex flex-wrap gap-3 py-2">
        {room.photos.map(({ id, caption, takenBy }) => (
          <li key={id} className="w-36">
            <a
              href={apiPaths.file(id)}
              target="_blank"
              rel="noreferrer"
              className="block h-28 overflow-hidden rounded border border-rule bg-tint"
            >
              <PhotoImage src={apiPaths.file(id)} words={caption || `Photo by ${takenBy}`} />
            </a>
            <span className="block pt-1 text-note leading-tight">{caption}</span>
            <span className="block text-note text-graphite">{takenBy}</span>
          </li>
        ))}
      </ul>
    </div>
  ));
}
