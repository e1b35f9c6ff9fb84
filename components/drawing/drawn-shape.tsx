import Link from 'next/link';
import { createElement, Fragment, type ReactElement } from 'react';
import type { DrawnPart, DrawnText, Point, Shape } from '@/lib/drawing/shape';
import { DrawnWords } from './drawn-words';
import { layerLook, toneLook } from './layer-look';

/** Where a touched part leads; null where it leads nowhere. */
export type HrefOf = (part: DrawnPart['part']) => string | null;

/** Shapes over one another in their order. They never change places, so they need no keys. */
export function DrawnShapes({ shapes, hrefOf }: { shapes: readonly Shape[]; hrefOf?: HrefOf }) {
  return createElement(Fragment, null, ...shapes.map((shape) => drawn(shape, hrefOf)));
}

function drawn(shape: Shape, hrefOf?: HrefOf): ReactElement {
  switch (shape.kind) {
    case 'line':
      return <polyline points={pointList(shape.points)} className={layerLook[shape.layer]} />;
    case 'area':
      return <polygon points={pointList(shape.points)} className={layerLook[shape.layer]} />;
    case 'circle':
      return (
        <circle
          cx={round(shape.centre[0])}
          cy={round(shape.centre[1])}
          r={shape.radius}
          className={layerLook[shape.layer]}
        />
      );
    case 'text':
      return <DrawnLine text={shape} />;
    case 'part':
      return <Part part={shape} hrefOf={hrefOf} />;
  }
}

function Part({ part, hrefOf }: { part: DrawnPart; hrefOf?: HrefOf }) {
  const shapes = <DrawnShapes shapes={part.shapes} hrefOf={hrefOf} />;
  const href = hrefOf?.(part.part);
  if (!href) return <g>{shapes}</g>;
  return (
    <Link
      href={href}
      scroll={false}
      aria-label={part.label}
      className="outline-offset-4 [&:focus-visible_.stroke-ink]:stroke-blueprint [&:hover_.stroke-ink]:stroke-blueprint"
    >
      {part.touch ? <polygon points={pointList(part.touch)} className="fill-transparent" /> : null}
      {shapes}
    </Link>
  );
}

function DrawnLine({ text }: { text: DrawnText }) {
  const [x, y] = text.at;
  return (
    <text
      x={round(x)}
      y={round(y)}
      textAnchor={text.anchor}
      fontSize={text.sizePx}
      transform={
        text.turnDeg === 0 ? undefined : `rotate(${round(text.turnDeg)} ${round(x)} ${round(y)})`
      }
      className="stroke-sheet [paint-order:stroke] [stroke-linejoin:round] [stroke-width:3.5]"
      xmlSpace="preserve"
    >
      {text.spans.map(({ words, tone }) => (
        <tspan key={`${tone} ${words}`} className={toneLook[tone]}>
          <DrawnWords words={words} />
        </tspan>
      ))}
    </text>
  );
}

const pointList = (points: readonly Point[]) =>
  points.map(([x, y]) => `${round(x)},${round(y)}`).join(' ');

const round = (value: number) => Math.round(value * 100) / 100;
