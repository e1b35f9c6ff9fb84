import type { Reading, ReadingOf } from '@/lib/contracts/readings';
import type { WallBook } from '@/lib/contracts/wall-book';
import { standingReadings } from '@/lib/measure/standing-readings';
import { asRead } from '@/lib/walls-pad/as-read';
import { featureName } from '@/lib/words/feature-words';
import type { Region } from '@/lib/words/trade';

type WallElevationProps = {
  book: WallBook;
  wallId: string;
  region: Region;
  /** The feature being typed; drawn thick. */
  typed: ReadingOf<'feature'> | null;
};

const FRAME = { width: 360, height: 150, margin: 16 };
/** Drawn to the ceiling when that is read; until then this high. */
const WALL_HEIGHT_MM = 2_440;

/** The wall from inside the room, with what is on it: openings, services, studs. */
export function WallElevation({ book, wallId, region, typed }: WallElevationProps) {
  const wall = book.room.chains.flatMap(({ walls }) => walls).find(({ id }) => id === wallId);
  if (!wall) return null;
  const lengthMm = asRead(book).lengthMm.get(wallId)?.value ?? wall.nominalLengthMm;
  const { width, height, margin } = FRAME;
  const scale = Math.min(
    (width - 2 * margin) / Math.max(1, lengthMm),
    (height - 2 * margin) / WALL_HEIGHT_MM,
  );
  const left = (width - lengthMm * scale) / 2;
  const floor = (height + WALL_HEIGHT_MM * scale) / 2;
  const x = (mm: number) => left + mm * scale;
  const y = (mm: number) => floor - mm * scale;
  const standing = standingReadings(book.readings).filter(({ id }) => id !== typed?.replaces);
  const box = (feature: ReadingOf<'feature'>) => ({
    x: x(feature.x0Mm),
    y: y(feature.z1Mm),
    width: Math.max(1, (feature.x1Mm - feature.x0Mm) * scale),
    height: Math.max(1, (feature.z1Mm - feature.z0Mm) * scale),
  });
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      preserveAspectRatio="xMidYMid meet"
      className="absolute inset-0 size-full font-sans"
    >
      <title>{`Wall ${wall.name} from inside the room`}</title>
      <rect
        x={x(0)}
        y={y(WALL_HEIGHT_MM)}
        width={lengthMm * scale}
        height={WALL_HEIGHT_MM * scale}
        className="fill-paper stroke-ink"
        strokeWidth={1.5}
      />
      {onWall(standing, wallId, 'stud').map((stud) => (
        <path
          key={stud.id}
          d={`M${x(stud.xMm)} ${y(0)}V${y(WALL_HEIGHT_MM)}`}
          strokeDasharray="8 3 2 3"
          className="stroke-graphite"
        />
      ))}
      {onWall(standing, wallId, 'feature').map((feature) => (
        <g key={feature.id}>
          <rect {...box(feature)} className="fill-sheet stroke-ink" />
          <text
            x={box(feature).x + 3}
            y={box(feature).y + 11}
            className="fill-graphite text-[10px]"
          >
            {featureName(feature.feature, region)}
          </text>
        </g>
      ))}
      {typed ? <rect {...box(typed)} strokeWidth={3} className="fill-tint stroke-pine" /> : null}
      <text x={x(0) + 3} y={y(0) - 4} className="fill-graphite text-[11px] font-bold">
        {wall.name}
      </text>
    </svg>
  );
}

function onWall<K extends 'stud' | 'feature'>(
  readings: Reading[],
  wallId: string,
  kind: K,
): ReadingOf<K>[] {
  return readings.filter(
    (reading): reading is ReadingOf<K> =>
      reading.kind === kind && 'wallId' in reading && reading.wallId === wallId,
  );
}
