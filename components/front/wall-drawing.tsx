import { LengthTspan } from '@/components/ui/length-tspan';
import type { LengthUnit } from '@/lib/units/brands';
import { gapStepMm } from './check-tools';
import type { WallResult, WallWay } from './check-wall';
import type { Point } from './corner-geometry';

type WallDrawingProps = { result: WallResult; way: WallWay; unit: LengthUnit };

/** Drawn length of the straightedge, and of the greatest gap. */
const length = 420;
const deepest = 62;
const magnifications = [100, 50, 20, 10, 5, 2, 1];

/** The straightedge and the wall behind it: from above, or from the side when it stands plumb. */
export function WallDrawing({ result, way, unit }: WallDrawingProps) {
  const { points, lengthMm } = result;
  const startMm = points[0]?.atMm ?? 0;
  const scale = length / (lengthMm || 1);
  const greatestMm = Math.max(...points.map(({ sMm }) => Math.abs(sMm)));
  const times = magnifications.find((by) => greatestMm * scale * by <= deepest) ?? 1;
  const place = (atMm: number, gapMm: number): Point => {
    const along = (atMm - startMm) * scale;
    const away = gapMm * scale * times;
    return way === 'along' ? { x: along, y: -away } : { x: -away, y: -along };
  };
  const face = points.map(({ atMm, sMm }) => place(atMm, -sMm));
  const behind = [place(startMm + lengthMm, 0), place(startMm, 0)].map(({ x, y }) =>
    way === 'along' ? { x, y: -deepest - 22 } : { x: -deepest - 22, y },
  );
  const line = (list: Point[]) =>
    list.map(({ x, y }) => `${x.toFixed(1)} ${y.toFixed(1)}`).join('L');
  const box = way === 'along' ? '-22 -100 464 150' : '-110 -446 260 490';
  return (
    <svg
      viewBox={box}
      className={`fill-ink text-[15px] ${way === 'along' ? 'w-full' : 'mx-auto max-h-112 w-full'}`}
      role="img"
      aria-label={way === 'along' ? 'The wall from above' : 'The wall from the side'}
    >
      <defs>
        <pattern
          id="check-wall"
          width="6"
          height="6"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <path d="M0 0V6" className="stroke-graphite" strokeWidth="0.8" />
        </pattern>
      </defs>
      <path d={`M${line([...face, ...behind])}Z`} fill="url(#check-wall)" />
      <path d={`M${line(face)}`} className="stroke-ink" strokeWidth="3" fill="none" />
      <path
        d={`M${line([place(startMm, 0), place(startMm + lengthMm, 0)])}`}
        className="stroke-blueprint"
        strokeWidth="2"
      />
      {points.map(({ id, atMm, sMm }) => {
        const foot = place(atMm, 0);
        return (
          <g key={id}>
            <path
              d={`M${line([foot, place(atMm, -sMm)])}`}
              className="stroke-blueprint"
              strokeDasharray="3 3"
            />
            <text
              x={way === 'along' ? foot.x : foot.x + 14}
              y={way === 'along' ? foot.y + 20 : foot.y + 5}
              textAnchor={way === 'along' ? 'middle' : 'start'}
            >
              <LengthTspan mm={-sMm} unit={unit} stepMm={gapStepMm(unit)} />
            </text>
          </g>
        );
      })}
      <text
        x={way === 'along' ? 442 : 14}
        y={way === 'along' ? 42 : 32}
        textAnchor={way === 'along' ? 'end' : 'start'}
        className="fill-graphite"
      >
        {way === 'along' ? 'from above' : 'from the side'}, gaps drawn ×{times}
      </text>
    </svg>
  );
}
