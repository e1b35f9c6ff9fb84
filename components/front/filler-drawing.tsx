import { LengthTspan } from '@/components/ui/length-tspan';
import type { LengthUnit } from '@/lib/units/brands';
import type { FillerResult } from './check-filler';
import { readStepMm } from './check-tools';

const height = 260;
/** Drawn width of the blank. */
const widest = 150;

/** The filler from the front: the cabinet's plumb edge left, the wall right, the blank dashed around. */
export function FillerDrawing({ result, unit }: { result: FillerResult; unit: LengthUnit }) {
  const { mm, blankMm } = result;
  const scale = widest / Math.max(blankMm, mm.top, mm.middle, mm.bottom);
  const stepMm = readStepMm(unit);
  const edges = [
    { y: 0, mm: mm.top },
    { y: height / 2, mm: mm.middle },
    { y: height, mm: mm.bottom },
  ];
  const wall = edges.map(({ y, mm: width }) => `${(width * scale).toFixed(1)} ${y}`).join('L');
  const blank = blankMm * scale;
  return (
    <svg
      viewBox={`-90 -40 380 ${height + 62}`}
      className="w-full fill-ink text-[13px]"
      role="img"
      aria-label="The filler from the front"
    >
      <defs>
        <pattern
          id="filler-cut"
          width="6"
          height="6"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <path d="M0 0V6" className="stroke-chalk" strokeWidth="1.4" />
        </pattern>
      </defs>
      <path d={`M-80 0H0V${height}H-80`} className="fill-sheet stroke-ink" strokeWidth="1.4" />
      <text x="-40" y={height / 2} textAnchor="middle" className="fill-graphite">
        cabinet
      </text>
      <path d={`M0 0L${wall}L0 ${height}Z`} fill="url(#filler-cut)" className="stroke-chalk" />
      <path d={`M${wall}`} className="stroke-ink" strokeWidth="3" fill="none" />
      <path
        d={`M0 0H${blank}V${height}H0Z`}
        className="stroke-ink"
        strokeDasharray="5 4"
        fill="none"
      />
      <path
        d={`M0 -16H${blank}M-4 -12l8-8M${blank - 4} -12l8-8`}
        className="stroke-graphite"
        fill="none"
      />
      <text x={blank / 2} y="-23" textAnchor="middle" className="font-bold">
        <LengthTspan mm={blankMm} unit={unit} stepMm={stepMm} />
      </text>
      {edges.map(({ y, mm: width }) => (
        <text key={y} x={blank + 12} y={y === 0 ? 12 : y === height ? y - 2 : y + 4}>
          <LengthTspan mm={width} unit={unit} stepMm={stepMm} />
        </text>
      ))}
      <text x={blank + 60} y={height / 2 + 4} className="fill-graphite">
        wall
      </text>
      <text x="290" y={height + 20} textAnchor="end" className="fill-graphite">
        from the front, widths to scale
      </text>
    </svg>
  );
}
