import { TitleBlock } from '@/components/ui/title-block';
import { type RoomShape, roomShapeWords } from '@/lib/walls-pad/room-shapes';

const drawings: Record<RoomShape, string> = {
  one: 'M12 20H88',
  l: 'M12 14H88V58',
  u: 'M12 58V14H88V58',
  galley: 'M12 14H88M88 58H12',
  closed: 'M12 14H88V58H12Z',
};
const hints: Record<RoomShape, string> = {
  one: 'more can be added',
  l: 'one corner',
  u: 'two corners',
  galley: 'two sides facing',
  closed: 'every wall, and it proves itself',
};

/** The first touch of a new room: what it looks like from above. */
export function ShapePick({ onPick }: { onPick: (shape: RoomShape) => void }) {
  return (
    <section className="flex flex-1 flex-col gap-3 px-3.5 py-4">
      <TitleBlock level={1} title="Draw the room" />
      <p className="text-graphite">
        Which walls get read? Pick the nearest shape, seen from above. Corners, chimney breasts and
        bays come next.
      </p>
      <ul className="grid grid-cols-2 gap-2">
        {(Object.keys(drawings) as RoomShape[]).map((shape) => (
          <li key={shape}>
            <button
              type="button"
              onClick={() => onPick(shape)}
              className="flex w-full touch-manipulation flex-col items-center border border-graphite px-2 py-3 active:bg-tint"
            >
              <svg viewBox="0 0 100 72" className="h-20 w-28" aria-hidden="true">
                <path
                  d={drawings[shape]}
                  strokeWidth={4}
                  className={`stroke-ink ${shape === 'closed' ? 'fill-paper' : 'fill-none'}`}
                />
              </svg>
              <span className="text-lead font-bold">{roomShapeWords[shape]}</span>
              <span className="text-note text-graphite">{hints[shape]}</span>
            </button>
          </li>
        ))}
      </ul>
    </section>
  );
}
