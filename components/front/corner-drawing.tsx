import { LengthTspan } from '@/components/ui/length-tspan';
import type { LengthUnit } from '@/lib/units/brands';
import type { CornerResult } from './check-corner';
import { readStepMm } from './check-tools';
import { cornerPlan, type Point } from './corner-geometry';
import { DimensionLine } from './dimension-line';

const at = ({ x, y }: Point) => `${x.toFixed(1)} ${y.toFixed(1)}`;

/** The corner seen from above: two walls, the three readings, a square cabinet and what is left over. */
export function CornerDrawing({ result, unit }: { result: CornerResult; unit: LengthUnit }) {
  const { mm, theta, offset } = result;
  const plan = cornerPlan({
    legLeftMm: mm.legLeft,
    legRightMm: mm.legRight,
    depthMm: mm.depth,
    thetaDeg: theta.value,
    offsetMm: offset?.value ?? null,
  });
  const { leftEnd, rightEnd, outer, leftMark, rightMark, wedge, cabinet } = plan;
  const stepMm = readStepMm(unit);
  const length = (lengthMm: number) => <LengthTspan mm={lengthMm} unit={unit} stepMm={stepMm} />;
  const middle = { x: (leftMark.x + rightMark.x) / 2, y: (leftMark.y + rightMark.y) / 2 };
  const left = Math.min(0, leftEnd.x, outer.left.x) - 74;
  const width = Math.max(rightEnd.x, leftEnd.x) + 20 - left;
  const height = leftEnd.y + 78;
  return (
    <svg
      viewBox={`${left.toFixed(1)} -52 ${width.toFixed(1)} ${height.toFixed(1)}`}
      className="w-full fill-ink text-[13px]"
      role="img"
      aria-label="The corner from above, with the readings as typed"
    >
      <defs>
        <pattern
          id="corner-wall"
          width="6"
          height="6"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <path d="M0 0V6" className="stroke-graphite" strokeWidth="0.8" />
        </pattern>
        <pattern
          id="corner-wedge"
          width="5"
          height="5"
          patternUnits="userSpaceOnUse"
          patternTransform="rotate(45)"
        >
          <path d="M0 0V5" className="stroke-chalk" strokeWidth="1.4" />
        </pattern>
      </defs>
      <path
        d={`M${at(leftEnd)}L0 0L${at(rightEnd)}L${at(outer.right)}L${at(outer.corner)}L${at(outer.left)}Z`}
        fill="url(#corner-wall)"
      />
      {cabinet ? (
        <g>
          <rect {...cabinet} className="fill-sheet stroke-ink" strokeWidth="1.4" />
          <text
            x={cabinet.x + cabinet.width / 2}
            y={cabinet.height / 2}
            textAnchor="middle"
            className="fill-graphite"
          >
            base
          </text>
        </g>
      ) : null}
      {wedge ? (
        <path
          d={`M${wedge.map(at).join('L')}Z`}
          fill="url(#corner-wedge)"
          className="stroke-chalk"
          strokeWidth="1"
        />
      ) : null}
      {cabinet && offset && Math.abs(offset.value) >= stepMm / 2 ? (
        <text
          x={cabinet.x + 7}
          y={offset.value > 0 ? 19 : cabinet.height - 9}
          className="fill-chalk font-bold"
        >
          {length(Math.abs(offset.value))}
        </text>
      ) : null}
      <path
        d={`M${at(leftEnd)}L0 0L${at(rightEnd)}`}
        className="stroke-ink"
        strokeWidth="3"
        fill="none"
      />
      <path
        d={`M${at(leftMark)}L${at(rightMark)}`}
        className="stroke-blueprint"
        strokeDasharray="6 4"
        strokeWidth="1.3"
      />
      <circle cx={leftMark.x} cy={leftMark.y} r="3.5" className="fill-blueprint" />
      <circle cx={rightMark.x} cy={rightMark.y} r="3.5" className="fill-blueprint" />
      <DimensionLine from={{ x: 0, y: 0 }} to={rightMark} offset={30}>
        {length(mm.legRight)}
      </DimensionLine>
      <DimensionLine from={{ x: 0, y: 0 }} to={leftMark} offset={-30}>
        {length(mm.legLeft)}
      </DimensionLine>
      <text x={middle.x + 10} y={middle.y + 16} className="fill-blueprint">
        {length(mm.diagonal)}
      </text>
      <text x={rightEnd.x} y={leftEnd.y + 18} textAnchor="end" className="fill-graphite">
        from above{plan.times > 1 ? `, out-of-true drawn ×${plan.times}` : ''}
      </text>
    </svg>
  );
}
