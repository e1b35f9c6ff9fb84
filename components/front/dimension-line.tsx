import type { ReactNode } from 'react';
import type { Point } from './corner-geometry';

type DimensionLineProps = {
  from: Point;
  to: Point;
  /** How far the line stands off the thing it measures; which side by its sign. */
  offset: number;
  children: ReactNode;
};

/** A dimension as it is drawn: thin line, oblique ticks, the figure upright beside its middle. */
export function DimensionLine({ from, to, offset, children }: DimensionLineProps) {
  const length = Math.hypot(to.x - from.x, to.y - from.y) || 1;
  const along = { x: (to.x - from.x) / length, y: (to.y - from.y) / length };
  const away = { x: along.y * offset, y: -along.x * offset };
  const a = { x: from.x + away.x, y: from.y + away.y };
  const b = { x: to.x + away.x, y: to.y + away.y };
  const middle = { x: (a.x + b.x) / 2 + Math.sign(offset) * along.y * 8, y: (a.y + b.y) / 2 };
  const isUpright = Math.abs(along.y) > 0.5;
  return (
    <g>
      <path
        d={`M${a.x} ${a.y}L${b.x} ${b.y}M${a.x - 4} ${a.y + 4}l8-8M${b.x - 4} ${b.y + 4}l8-8`}
        className="stroke-graphite"
        fill="none"
      />
      <text
        x={middle.x}
        y={isUpright ? middle.y + 4 : middle.y - Math.sign(offset) * 7}
        textAnchor={isUpright ? (offset * along.y > 0 ? 'start' : 'end') : 'middle'}
      >
        {children}
      </text>
    </g>
  );
}
